import { readFileSync } from 'node:fs';
import { ageingFactor, ageingRate } from '@shared/engine/service/ageing';
import { caseLength_mm } from '@shared/engine/service/case-size';
import { type Dielectric, readDielectric } from '@shared/engine/service/dielectric';
import { inService } from '@shared/engine/service/in-service';
import { temperatureFactor } from '@shared/engine/service/temperature';
import { toleranceFactors } from '@shared/engine/service/tolerance';
import { describe, expect, it } from 'vitest';

/** Published values of codes and ageing; each entry names its source and whether it was read, computed or remembered. */
interface Check {
  id: string;
  topic: string;
  inputs: {
    code: string;
    letter: string;
    first_letter: string;
    digit: string;
    third_letter: string;
    imperial: string;
    metric: string;
    tolerance: string;
    dielectric: string;
    T_degC: number;
    C25_pF: number;
    C25_nF: number;
    C_uF: number;
    k_pct_per_decade: number;
    t_from_h: number;
    t_to_h: number;
  };
  expected: number;
  tolerance_rel?: number;
  tolerance_abs?: number;
  source: string;
  mark: string;
  rule_mark?: string;
}
const checks: Check[] = JSON.parse(
  readFileSync(new URL('../fixtures/published-checks.json', import.meta.url), 'utf8'),
);
const mine = checks.filter(({ topic }) => topic === '1 codes' || topic === '2 ageing');
const seen = new Set<string>();

function title({ id, mark, rule_mark, source }: Check): string {
  seen.add(id);
  const rule = rule_mark === 'MEMORY' && mark !== 'MEMORY' ? ', rule from MEMORY' : '';
  return `${id} (${mark}${rule}: ${source.slice(0, 90)})`;
}

/** Checks every entry whose id fits at its own tolerance; there must be `count` of them. */
function compare(ids: RegExp, count: number, compute: (inputs: Check['inputs'], id: string) => number): void {
  const found = mine.filter(({ id }) => ids.test(id));
  if (found.length !== count) throw new Error(`${ids} finds ${found.length} published checks, not ${count}`);
  for (const check of found)
    it(title(check), () => {
      const { expected, tolerance_rel = 0, tolerance_abs = 0 } = check;
      const allowed = Math.max(tolerance_abs, Math.abs(expected) * tolerance_rel * (1 + 1e-6), 1e-15);
      expect(Math.abs(compute(check.inputs, check.id) - expected)).toBeLessThanOrEqual(allowed);
    });
}

const class1 = (code: string): Extract<Dielectric, { class: 1 }> => {
  const read = readDielectric(code);
  if (read?.class !== 1) throw new Error(`${code} is not read as class 1`);
  return read;
};
const class2 = (code: string): Exclude<Dielectric, { class: 1 }> => {
  const read = readDielectric(code);
  if (!read || read.class === 1) throw new Error(`${code} is not read as class 2`);
  return read;
};

describe('tolerance letters', () => {
  compare(/^tol-.-low$/, 6, (c) => 100 * (toleranceFactors(c.letter, 1e-6).low - 1));
  compare(/^tol-.-high$/, 6, (c) => 100 * (toleranceFactors(c.letter, 1e-6).high - 1));
  compare(/^tol-.-pF$/, 3, (c) => 8 * (toleranceFactors(c.letter, 8e-12).high - 1));

  /** `104`, `4R7` in pF. */
  const picofarad = (digits: string): number =>
    digits.includes('R') ? Number(digits.replace('R', '.')) : Number(`${digits.slice(0, 2)}e${digits[2]}`);
  compare(/^span-.*-(min|max)$/, 10, ({ code }, id) => {
    const value = picofarad(code.slice(0, -1));
    const { low, high } = toleranceFactors(code.slice(-1), value * 1e-12);
    return value * (id.endsWith('min') ? low : high);
  });
});

describe('class 2 and 3 dielectric codes', () => {
  compare(/^c2-low-/, 3, (c) => class2(`${c.first_letter}7R`).low_C);
  compare(/^c2-high-/, 7, (c) => class2(`X${c.digit}R`).high_C);
  compare(/^c2-chg-.-low$/, 12, (c) => 100 * class2(`X7${c.third_letter}`).lowest);
  compare(/^c2-chg-.-high$/, 12, (c) => 100 * class2(`X7${c.third_letter}`).highest);
  // Lowest by tolerance and limits: no voltage, at the reference age.
  compare(
    /^c2-.*-min$/,
    2,
    ({ C_uF, code, tolerance }) =>
      1e6 *
      inService(
        {
          capacitance_F: C_uF * 1e-6,
          esr_ohm: 0,
          esl_H: 0,
          technology: 'ceramic',
          dielectric: code,
          tolerance,
        },
        { voltage_V: 0, temperature_C: 85, age_h: 1000, capacitance: 'low', esr: 'nominal', esl: 'nominal' },
      ).capacitance_F,
  );
});

describe('class 1 dielectric codes', () => {
  compare(/^c1-...-ppm$/, 10, (c) => class1(c.code).slope_ppmPerK);
  compare(/^c1-...-tol$/, 10, (c) => class1(c.code).tolerance_ppmPerK);
  const at = (dielectric: string, temperature_C: number) =>
    temperatureFactor({ capacitance_F: 1e-9, esr_ohm: 0, esl_H: 0, dielectric }, temperature_C);
  compare(/^c1-U2J-100pF-85C$/, 1, (c) => c.C25_pF * at(c.code, c.T_degC).factor);
  compare(/^c1-C0G-100nF-125C-span$/, 1, (c) => c.C25_nF * (at(c.code, c.T_degC).high - 1));
});

describe('case lengths that the bias estimate goes by', () => {
  compare(/^case-.*-L$/, 9, (c) => {
    expect(caseLength_mm(c.metric)).toBe(caseLength_mm(c.imperial));
    return caseLength_mm(c.imperial) ?? Number.NaN;
  });
});

describe('ageing', () => {
  const rate = (dielectric: string) => ageingRate({ technology: 'ceramic', dielectric }).percentPerDecade;
  compare(/^age-rate-/, 4, (c) => rate(c.dielectric));
  for (const check of mine.filter(({ id }) => id.startsWith('age-range-')))
    it(title(check), () => {
      for (const code of check.inputs.dielectric.split('/')) {
        if (check.id.endsWith('low')) expect(rate(code)).toBeGreaterThanOrEqual(check.expected);
        else expect(rate(code)).toBeLessThanOrEqual(check.expected);
      }
    });
  const change = (c: Check['inputs']) => 100 * (ageingFactor(c.k_pct_per_decade, c.t_to_h, c.t_from_h) - 1);
  compare(/^age-(1pc-1000h|X7R-10h|X7R-1000h|Y5V-1000h)$/, 4, change);
  compare(/^age-(X7R|Y5V)-ref1000-/, 3, change);
  compare(/^age-X7R-1h-over-1000h$/, 1, (c) => 1 / ageingFactor(c.k_pct_per_decade, 1000, 1));
  // The law is linear; compounding is three decades, each counted from its own start.
  compare(/^age-X7R-compound-1000h$/, 1, (c) => ageingFactor(c.k_pct_per_decade, 10, 1) ** 3);
});

it('leaves no published check of these topics out', () => {
  expect(mine.map(({ id }) => id).filter((id) => !seen.has(id))).toEqual([]);
});
