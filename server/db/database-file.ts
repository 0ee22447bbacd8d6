import path from 'node:path';

export const databaseFile = (dataFolder: string): string => path.join(dataFolder, 'millpond.db');
