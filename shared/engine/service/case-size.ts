/** Longer side of a chip by its code, mm: the inch code, and the metric one with M behind it (KEMET, Samsung and case-size lists). */
const LENGTH_MM = new Map<string, number>(
  (
    [
      ['01005', '0402M', 0.4],
      ['0201', '0603M', 0.6],
      ['0402', '1005M', 1.0],
      ['0603', '1608M', 1.6],
      ['0805', '2012M', 2.0],
      ['1206', '3216M', 3.2],
      ['1210', '3225M', 3.2],
      ['1808', '4520M', 4.5],
      ['1812', '4532M', 4.5],
      ['1825', '4564M', 6.4],
      ['2220', '5750M', 5.7],
      ['2225', '5664M', 6.4],
      ['0306', '0816M', 1.6],
      ['0508', '1220M', 2.0],
      ['0612', '1632M', 3.2],
    ] as const
  ).flatMap(([inch, metric, length]): [string, number][] => [
    [inch, length],
    [metric, length],
  ]),
);

/** Longer side of a chip case in mm, or null for a code that is not known. Four digits alone are read as inch. */
export const caseLength_mm = (code: string | undefined): number | null =>
  LENGTH_MM.get(code?.trim().toUpperCase() ?? '') ?? null;
