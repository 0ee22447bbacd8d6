interface Tally {
  total: number;
  hold: number;
  short: number;
  unknown: number;
}

/** ▽ 4 hold  ▲ 1 short  – 1 without result: signs and words, never a colour alone. */
export function RailTally({ rails, inService }: { rails: Tally; inService?: boolean }) {
  if (rails.total === 0) return <span className="text-stone">no rails yet</span>;
  return (
    <span className="inline-flex flex-wrap gap-x-4 whitespace-nowrap">
      {rails.hold > 0 && (
        <span className="text-reed">
          ▽ {rails.hold} hold{inService && ' in service'}
        </span>
      )}
      {rails.short > 0 && <span className="text-kingfisher">▲ {rails.short} short</span>}
      {rails.unknown > 0 && <span className="text-stone">– {rails.unknown} without result</span>}
    </span>
  );
}
