import { Initial1767225600000 } from './1767225600000-initial';
import { CompareWithLatestRevision1769904000000 } from './1769904000000-compare-with-latest-revision';
import { PartBehaviour1770508800000 } from './1770508800000-part-behaviour';
import { BoardSetup1770595200000 } from './1770595200000-board-setup';

/** In the order in which they run. A new one goes to the end and is never edited once released. */
export const migrations = [
  Initial1767225600000,
  CompareWithLatestRevision1769904000000,
  PartBehaviour1770508800000,
  BoardSetup1770595200000,
];
export const migrationNames = migrations.map((migration) => migration.name);
