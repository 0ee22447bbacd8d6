/**
 * Places for labels that want to stand at `wanted` (in rising order): at least `gap` apart, as near to what they want as that
 * allows (least squares), all between `low` and `high` where there is room for that.
 */
export function spread(wanted: readonly number[], gap: number, low: number, high: number): number[] {
  // Without the gaps the places need only not fall; labels that would collide are pooled at their mean.
  const pools: { sum: number; count: number }[] = [];
  wanted.forEach((place, i) => {
    let pool = { sum: place - i * gap, count: 1 };
    for (
      let last = pools.at(-1);
      last && last.sum / last.count >= pool.sum / pool.count;
      last = pools.at(-1)
    ) {
      pools.pop();
      pool = { sum: pool.sum + last.sum, count: pool.count + last.count };
    }
    pools.push(pool);
  });
  const room = Math.max(low, high - (wanted.length - 1) * gap);
  const flat = pools.flatMap(({ sum, count }) => new Array<number>(count).fill(sum / count));
  return flat.map((place, i) => Math.min(room, Math.max(low, place)) + i * gap);
}
