import path from 'node:path';
import { z } from 'zod';

const flag = z.enum(['0', '1']).transform((text) => text === '1');

const webAddress = z
  .url({ protocol: /^https?$/, error: 'must be an http or https address' })
  .transform((text) => text.replace(/\/+$/, ''));

/** A number of proxies in front, or a comma-separated list of their addresses; 0 trusts none. */
const trustProxySchema = z
  .string()
  .regex(/^(\d{1,2}|[A-Za-z0-9.:/, ]+)$/, 'must be a number of proxies or a list of addresses')
  .transform((text) => (/^\d+$/.test(text) ? Number(text) : text.split(',').map((item) => item.trim())));

const environmentSchema = z.object({
  NODE_ENV: z.string().optional(),
  PORT: z.coerce.number().int().min(0).max(65_535).default(4780),
  HOST: z.string().min(1).default('127.0.0.1'),
  MILLPOND_DATA: z.string().min(1).default('data'),
  MILLPOND_BASE_URL: webAddress.optional(),
  MILLPOND_TRUST_PROXY: trustProxySchema.default(0),
  MILLPOND_SECRET: z.string().min(32, 'must have at least 32 characters').optional(),
  MILLPOND_DEMO: flag.default(true),
  MILLPOND_SMTP_URL: z
    .url({ protocol: /^smtps?$/, error: 'must be an smtp:// or smtps:// address' })
    .optional(),
  MILLPOND_MAIL_FROM: z.string().min(3).default('Millpond <millpond@localhost>'),
  MILLPOND_RATE_LIMIT: z.coerce.number().int().min(0).max(1_000_000).default(10),
  MILLPOND_LOG_LEVEL: z.enum(['silent', 'fatal', 'error', 'warn', 'info', 'debug', 'trace']).default('info'),
});

export interface Config {
  port: number;
  host: string;
  dataFolder: string;
  baseUrl: string;
  /** The session cookie is sent over https only. */
  secureCookie: boolean;
  trustProxy: number | string[];
  secret: string | undefined;
  demo: boolean;
  smtpUrl: string | undefined;
  mailFrom: string;
  /** Failed sign-ins a quarter of an hour from one address for one person; 0 switches all limits off. */
  rateLimit: number;
  logLevel: string;
}

export class ConfigError extends Error {}

/** Reads the environment once; a wrong value is named, never guessed at. Empty values count as not given. */
export function readConfig(environment: NodeJS.ProcessEnv): Config {
  const given = Object.fromEntries(Object.entries(environment).filter(([, value]) => value !== ''));
  const parsed = environmentSchema.safeParse(given);
  if (!parsed.success)
    throw new ConfigError(
      parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`).join('; '),
    );
  const env = parsed.data;
  const baseUrl = env.MILLPOND_BASE_URL ?? `http://${urlHost(env.HOST)}:${env.PORT}`;
  return {
    port: env.PORT,
    host: env.HOST,
    dataFolder: path.resolve(env.MILLPOND_DATA),
    baseUrl,
    secureCookie: env.MILLPOND_BASE_URL ? baseUrl.startsWith('https:') : env.NODE_ENV === 'production',
    trustProxy: env.MILLPOND_TRUST_PROXY,
    secret: env.MILLPOND_SECRET,
    demo: env.MILLPOND_DEMO,
    smtpUrl: env.MILLPOND_SMTP_URL,
    mailFrom: env.MILLPOND_MAIL_FROM,
    rateLimit: env.MILLPOND_RATE_LIMIT,
    logLevel: env.MILLPOND_LOG_LEVEL,
  };
}

function urlHost(host: string): string {
  if (host === '0.0.0.0' || host === '::') return 'localhost';
  return host.includes(':') ? `[${host}]` : host;
}
