import path from 'node:path';
import { type ParseArgsConfig, parseArgs } from 'node:util';
import { BadInput } from './bad-input';

/** Options and words of a command; what it does not know is bad input. */
export function readArguments<T extends NonNullable<ParseArgsConfig['options']>>(args: string[], options: T) {
  try {
    return parseArgs({ args, options, allowPositionals: true, strict: true });
  } catch (error) {
    throw new BadInput(error instanceof Error ? error.message : String(error));
  }
}

/** The one file that a command names. */
export function oneFile(positionals: string[], command: string): string {
  if (positionals.length !== 1) throw new BadInput(`${command} takes one file: ${command} FILE`);
  return positionals[0];
}

/** A path as the person meant it: npm runs scripts in the project's folder and says where it was called. */
export const userPath = (file: string): string => path.resolve(process.env.INIT_CWD ?? process.cwd(), file);
