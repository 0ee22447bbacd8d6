/** The sign of the traces' loop in drawings and bars; the loop of the vias is a plain tint. */
export function TraceHatch({ id }: { id: string }) {
  return (
    <pattern id={id} width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
      <rect width="5" height="5" className="fill-paper" />
      <line x1="0" y1="0" x2="0" y2="5" className="stroke-deep" strokeWidth="2.4" />
    </pattern>
  );
}
