import { nameSchema } from '@shared/schemas/common.schema';
import { emailSchema, passwordSchema } from '@shared/schemas/person.schema';
import type { z } from 'zod';
import { createAdmin } from '../services/admin.service';
import { isPublicPassword, PUBLIC_PASSWORD } from '../services/new-password';
import { readArguments } from './arguments';
import { BadInput } from './bad-input';
import { ask, readStdin } from './prompt';
import { withContext } from './with-context';

function checked<T extends z.ZodType>(what: string, schema: T, value: string): z.output<T> {
  const parsed = schema.safeParse(value);
  if (!parsed.success) throw new BadInput(`${what}: ${parsed.error.issues[0].message}`);
  return parsed.data;
}

async function given(what: string, value: string | undefined): Promise<string> {
  if (value !== undefined) return value;
  if (!process.stdin.isTTY) throw new BadInput(`${what} is missing: give --${what}`);
  return ask(`${what}: `);
}

async function readPassword(fromStdin: boolean): Promise<string> {
  if (fromStdin) return readStdin();
  if (!process.stdin.isTTY) throw new BadInput('password is missing: give --password-stdin');
  const password = await ask('password: ', true);
  if ((await ask('once more: ', true)) !== password) throw new BadInput('the two passwords differ');
  return password;
}

/** An administrator made here is a real one, demo mode or not. */
const adminPasswordSchema = passwordSchema.refine((text) => !isPublicPassword(text), PUBLIC_PASSWORD);

export async function run([action, ...args]: string[]): Promise<number> {
  if (action !== 'create') throw new BadInput('admin takes one action: admin create');
  const { values, positionals } = readArguments(args, {
    email: { type: 'string' },
    name: { type: 'string' },
    'password-stdin': { type: 'boolean', default: false },
  });
  if (positionals.length > 0) throw new BadInput(`unexpected word: ${positionals[0]}`);
  const email = checked('email', emailSchema, await given('email', values.email));
  const name = checked('name', nameSchema, await given('name', values.name));
  const password = checked('password', adminPasswordSchema, await readPassword(values['password-stdin']));
  const made = await withContext((ctx) => createAdmin(ctx, { email, name, password }));
  if (!made) throw new BadInput(`email: someone with the address ${email} is here already`);
  process.stdout.write(`${name} <${email}> can sign in as administrator.\n`);
  return 0;
}
