import { randomBytes } from 'node:crypto';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

/** The signing secret kept in the data folder, made on first use and readable by the server's user only. */
export function keptSecret(dataFolder: string): string {
  const file = path.join(dataFolder, 'secret');
  mkdirSync(dataFolder, { recursive: true, mode: 0o700 });
  try {
    writeFileSync(file, randomBytes(48).toString('base64url'), { mode: 0o600, flag: 'wx' });
  } catch (error) {
    if (!(error instanceof Error && 'code' in error && error.code === 'EEXIST')) throw error;
  }
  const secret = readFileSync(file, 'utf8').trim();
  if (secret.length < 32)
    throw new Error('the secret in the data folder is too short; remove the file to make a new one');
  return secret;
}
