/** Two formatted quantities as one, the unit once where both have the same: `22` `→` `9.41 µF`, `14.4` `of` `24.0 mV`. */
export function shareUnit(first: string, joint: string, second: string): string {
  const unit = second.slice(second.indexOf('\u00a0'));
  return first.endsWith(unit)
    ? `${first.slice(0, -unit.length)} ${joint} ${second}`
    : `${first} ${joint} ${second}`;
}
