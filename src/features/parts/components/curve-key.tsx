import type { ReactNode } from 'react';

function Key({ children, text }: { children: ReactNode; text: string }) {
  return (
    <span>
      <svg width="24" height="10" className="mr-2 inline-block" fill="none" aria-hidden="true">
        {children}
      </svg>
      {text}
    </span>
  );
}

/** How the lines of the capacitance charts read. */
export function CurveKey() {
  return (
    <p className="mt-2 flex flex-wrap gap-x-6 text-small text-stone">
      <Key text="all as chosen">
        <path d="M0 5H24" className="stroke-ink" strokeWidth="2" />
      </Key>
      <Key text="this condition alone">
        <path d="M0 5H24" className="stroke-stone" />
      </Key>
      <Key text="dashed: estimated">
        <path d="M0 5H24" className="stroke-ink" strokeWidth="2" strokeDasharray="6 4" />
      </Key>
      <Key text="band: only limits are known">
        <path d="M0 0H24V10H0Z" className="fill-shallow" fillOpacity="0.5" />
      </Key>
    </p>
  );
}
