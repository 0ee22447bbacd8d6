import { config as loadEnvironmentFile } from 'dotenv';
import { type Config, ConfigError, readConfig } from '../config/environment';
import { BadInput } from './bad-input';

/** The same settings that the server reads; the log keeps quiet unless something is wrong. */
export function commandConfig(): Config {
  loadEnvironmentFile({ quiet: true });
  try {
    return { ...readConfig(process.env), logLevel: 'error' };
  } catch (error) {
    if (error instanceof ConfigError) throw new BadInput(`wrong setting: ${error.message}`);
    throw error;
  }
}
