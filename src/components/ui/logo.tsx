/** The pond: a half sun over its surface, two ripples. */
export function Logo() {
  return (
    <svg viewBox="0 0 32 32" width="26" height="26" fill="none" strokeWidth="2.2" aria-hidden="true">
      <path d="M8 17a8 8 0 0 1 16 0" className="stroke-ink" />
      <path d="M2 17h28" className="stroke-deep" />
      <path d="M9 22h14" className="stroke-shallow" />
      <path d="M13 26.5h6" className="stroke-shallow" />
    </svg>
  );
}
