/** 1 → A, 26 → Z, 27 → AA … */
export function revisionLetter(number: number): string {
  let letters = '';
  for (let rest = number; rest > 0; rest = Math.floor((rest - 1) / 26))
    letters = String.fromCharCode(65 + ((rest - 1) % 26)) + letters;
  return letters;
}
