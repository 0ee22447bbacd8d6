/** The lowest and the highest voltage seen, as [time, fall]; the settled one at time 0 to begin with. */
export class Extremes {
  lowest: readonly [number, number];
  highest: readonly [number, number];

  constructor(settled_V: number) {
    this.lowest = [0, settled_V];
    this.highest = [0, settled_V];
  }

  see(time_s: number, fall_V: number): void {
    if (fall_V > this.lowest[1]) this.lowest = [time_s, fall_V];
    if (fall_V < this.highest[1]) this.highest = [time_s, fall_V];
  }
}
