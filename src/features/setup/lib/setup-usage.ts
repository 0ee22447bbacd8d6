/** Which rails take something from the setup, so that one sees what a change touches. Composed where rails are known. */
export interface SetupUsage {
  /** Names of rails by the recipe's id. */
  recipes: ReadonlyMap<string, readonly string[]>;
  /** Names of rails by the names of the pair's layers, as `pairKey` joins them. */
  pairs: ReadonlyMap<string, readonly string[]>;
}

export const pairKey = (upper: string, lower: string): string => JSON.stringify([upper, lower]);
