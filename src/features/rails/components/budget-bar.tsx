import { useId } from 'react';
import { useWidth } from '@/components/chart/use-width';
import { type BudgetFigures, isSpent, overspentText, shareText } from '../lib/budget';
import { type BudgetPart, BudgetPatterns, fillOf, PARTS } from './budget-patterns';

const HEIGHT = 26;
/** The mark of the tolerance stands out of the bar by this much, px. */
const MARK = 5;
/** Room that the name of what is left takes in the bar, px. */
const NAME = 150;

/** A rail's tolerance as one bar: what it is spent on side by side, and what is left for the bank. */
export function BudgetBar({ figures }: { figures: BudgetFigures }) {
  const id = useId();
  const [ref, width] = useWidth<HTMLDivElement>();
  const spent = isSpent(figures);
  const { pieces, end } = laidOut(figures, width);
  return (
    <div ref={ref} className="flex flex-col gap-1">
      <svg
        role="img"
        aria-label={spokenText(figures)}
        width={width}
        height={HEIGHT + 2 * MARK}
        className="block overflow-visible"
      >
        <BudgetPatterns id={id} />
        <g transform={`translate(0 ${MARK})`}>
          {pieces.map(({ part, x, w }) => (
            <rect key={part} x={x} width={w} height={HEIGHT} {...fillOf(id, part)} />
          ))}
          {pieces.map(({ part, x }) => (
            <path key={part} d={`M${x} 0V${HEIGHT}`} className="stroke-ink" />
          ))}
          <rect width={width} height={HEIGHT} fill="none" className="stroke-ink" />
          {spent && <OverMark id={id} x={end} width={width} />}
          <LeftName pieces={pieces} />
        </g>
      </svg>
      {spent && (
        <p role="status" className="font-semibold text-kingfisher">
          ▲ {overspentText(figures)}
        </p>
      )}
    </div>
  );
}

interface Piece {
  part: BudgetPart;
  x: number;
  w: number;
}

/** The pieces of the bar in px, those of no width left out, and where the tolerance ends. */
function laidOut({ tolerance, spent, left }: BudgetFigures, width: number): { pieces: Piece[]; end: number } {
  const all = [...PARTS.map(([part]) => [part, spent[part].volts] as const), ['left', left.volts] as const];
  const shown = all.filter(([, volts]) => volts > 0);
  const total = Math.max(
    tolerance.volts,
    shown.reduce((sum, [part, volts]) => (part === 'left' ? sum : sum + volts), 0),
  );
  let x = 0;
  const pieces = shown.map(([part, volts]) => {
    const w = (volts / total) * width;
    x += w;
    return { part, x: x - w, w };
  });
  return { pieces, end: (tolerance.volts / total) * width };
}

/** Where the tolerance ends in an overspent bar, and what lies beyond. */
function OverMark({ id, x, width }: { id: string; x: number; width: number }) {
  return (
    <>
      <rect x={x} width={width - x} height={HEIGHT} className="fill-paper" />
      <rect x={x} width={width - x} height={HEIGHT} {...fillOf(id, 'over')} stroke="var(--kingfisher)" />
      <path d={`M${x} ${-MARK}V${HEIGHT + MARK}`} className="stroke-kingfisher" strokeWidth="2.4" />
    </>
  );
}

function LeftName({ pieces }: { pieces: readonly Piece[] }) {
  const left = pieces.find((piece) => piece.part === 'left');
  if (!left || left.w < NAME) return null;
  return (
    <text
      aria-hidden
      x={left.x + left.w / 2}
      y={HEIGHT / 2 + 4}
      textAnchor="middle"
      className="fill-paper text-small font-semibold"
    >
      left for the bank
    </text>
  );
}

/** The bar in one sentence. */
function spokenText(figures: BudgetFigures): string {
  const parts = PARTS.map(([part, name]) => `${name} ${shareText(figures.spent[part])}`);
  const end = isSpent(figures) ? overspentText(figures) : `${shareText(figures.left)} left for the bank`;
  return `rail tolerance ±${shareText(figures.tolerance)}: ${parts.join(', ')}; ${end}`;
}
