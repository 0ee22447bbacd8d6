import type { ReactNode } from 'react';
import { chainText, type FactorChain } from '../lib/factor-chain';

/**
 * `22 µF × bias 0.52 × cold 0.93 × aged 0.95 × tolerance 0.8 = 8.09 µF`: under each factor where it comes from. In one line where
 * there is room, else one factor a line.
 */
export function FactorChainLine({ chain, estimated }: { chain: FactorChain; estimated: boolean }) {
  return (
    <>
      <p className="sr-only" aria-live="polite">
        {chainText(chain)}
      </p>
      <div
        aria-hidden
        className="grid gap-x-3 gap-y-3 sm:grid-cols-[auto_repeat(4,minmax(0,1fr))_auto] sm:gap-y-1"
      >
        <Piece head={<span className="font-semibold">{chain.start}</span>} note="catalogue" />
        {chain.terms.map(({ kind, name, text, estimated: isEstimate, basis }) => (
          <Piece
            key={kind}
            sign="×"
            head={
              <>
                {name} <span className="font-semibold">{text}</span>
              </>
            }
            estimated={isEstimate}
            note={basis}
          />
        ))}
        <Piece
          sign="="
          head={<span className="text-large leading-5 font-semibold">{chain.result}</span>}
          estimated={estimated}
          note="in service"
        />
      </div>
    </>
  );
}

interface PieceProps {
  sign?: string;
  head: ReactNode;
  note: string;
  estimated?: boolean;
}

function Piece({ sign, head, note, estimated = false }: PieceProps) {
  return (
    <div className="grid grid-cols-[1rem_8rem_minmax(0,1fr)] sm:block">
      <p className="contents whitespace-nowrap sm:block">
        <span className="text-stone sm:mr-2 sm:empty:hidden">{sign}</span>
        <span>{head}</span>
      </p>
      <p className="text-small text-stone">
        {estimated && <span className="text-brass sm:block">≈ estimated </span>}
        {note}
      </p>
    </div>
  );
}
