import { formatFixed } from '@shared/units/format';
import { type ReactNode, useId } from 'react';
import { cx } from '@/lib/class-names';
import { type BudgetFigures, isSpent, type Share } from '../lib/budget';
import { type BudgetPart, BudgetPatterns, fillOf, PARTS } from './budget-patterns';

const SWATCH = 14;

/** The bar's parts in millivolt and per cent, added up. */
export function BudgetTable({ figures }: { figures: BudgetFigures }) {
  const id = useId();
  const spent = isSpent(figures);
  const decimals = decimalsFor(figures.tolerance.volts);
  return (
    <table className="w-full max-w-md border-collapse">
      <caption className="sr-only">noise budget</caption>
      <thead className="sr-only">
        <tr>
          <th scope="col">part</th>
          <th scope="col">millivolt</th>
          <th scope="col">per cent of the rail</th>
        </tr>
      </thead>
      <tbody>
        {PARTS.map(([part, name]) => (
          <Row key={part} name={name} share={figures.spent[part]} decimals={decimals}>
            <Swatch id={id} part={part} />
          </Row>
        ))}
        <Row
          name="left for the bank"
          share={figures.left}
          decimals={decimals}
          className={cx('font-semibold', spent && 'text-kingfisher')}
        >
          <Swatch id={id} part={spent ? 'over' : 'left'} />
        </Row>
        <Row name="rail tolerance, ±" share={figures.tolerance} decimals={decimals} className="border-t" />
      </tbody>
    </table>
  );
}

interface RowProps {
  name: string;
  share: Share;
  decimals: number;
  className?: string;
  /** Its sample of the bar. */
  children?: ReactNode;
}

function Row({ name, share, decimals, className, children }: RowProps) {
  return (
    <tr className={className}>
      <th scope="row" className="py-0.5 pr-3 text-left [font-weight:inherit]">
        <span className="flex items-center gap-2">
          <span className="shrink-0" style={{ width: SWATCH }}>
            {children}
          </span>
          {name}
        </span>
      </th>
      <td className="py-0.5 pl-2 text-right whitespace-nowrap">
        {formatFixed(share.volts * 1000, decimals)} mV
      </td>
      <td className="py-0.5 pl-4 text-right whitespace-nowrap">{formatFixed(share.percent, 2)} %</td>
    </tr>
  );
}

function Swatch({ id, part }: { id: string; part: BudgetPart }) {
  const own = `${id}${part}-`;
  return (
    <svg aria-hidden width={SWATCH} height={SWATCH} className="block">
      <BudgetPatterns id={own} />
      <rect
        x="0.5"
        y="0.5"
        width={SWATCH - 1}
        height={SWATCH - 1}
        {...fillOf(own, part)}
        stroke={part === 'over' ? 'var(--kingfisher)' : 'var(--ink)'}
      />
    </svg>
  );
}

/** Decimals of a millivolt that show a hundredth of the tolerance or less. */
const decimalsFor = (volts: number): number => (volts >= 0.01 ? 1 : 2);
