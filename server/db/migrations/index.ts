import { Initial1767225600000 } from './1767225600000-initial';

/** In the order in which they run. A new one goes to the end and is never edited once released. */
export const migrations = [Initial1767225600000];
export const migrationNames = migrations.map((migration) => migration.name);
