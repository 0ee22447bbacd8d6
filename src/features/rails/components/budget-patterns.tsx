import type { SpentOn } from '../lib/budget';

export type BudgetPart = SpentOn | 'left' | 'over';

/** Each part of a budget by name, in the order in which it is drawn. */
export const PARTS: readonly (readonly [SpentOn, string])[] = [
  ['setpoint', 'set-point error'],
  ['drop', 'DC drop'],
  ['regulator', 'the regulator’s own ripple'],
];

/** Lines, hatch and dots tell the parts apart without their colours. `id` keeps two pictures from sharing a name. */
export function BudgetPatterns({ id }: { id: string }) {
  const common = { patternUnits: 'userSpaceOnUse', width: 6, height: 6 };
  return (
    <defs>
      <pattern id={`${id}setpoint`} {...common} height={5}>
        <path d="M0 2.5H6" className="stroke-stone" strokeWidth="1.4" />
      </pattern>
      <pattern id={`${id}drop`} {...common} patternTransform="rotate(45)">
        <path d="M3 0V6" className="stroke-stone" strokeWidth="1.8" />
      </pattern>
      <pattern id={`${id}regulator`} {...common}>
        <circle cx="1.6" cy="1.6" r="1.3" className="fill-stone" />
        <circle cx="4.6" cy="4.6" r="1.3" className="fill-stone" />
      </pattern>
      <pattern id={`${id}over`} {...common}>
        <path d="M0 0L6 6M6 0L0 6" className="stroke-kingfisher" strokeWidth="1.2" />
      </pattern>
    </defs>
  );
}

/** How a part is filled: what is left for the bank is solid, the rest has its pattern. */
export const fillOf = (id: string, part: BudgetPart) =>
  part === 'left' ? { className: 'fill-deep' } : { fill: `url(#${id}${part})` };
