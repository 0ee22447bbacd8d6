import { MINUS } from '../../units/format';

/** Where a factor comes from, in a few plain words; made here so that screens, reports and tests say the same. */
export const BASIS = {
  asGiven: 'as given',
  biasCurve: 'bias curve',
  beyondBiasCurve: 'bias curve, extended beyond its last point',
  noBias: 'no DC voltage',
  noRating: 'no rated voltage given: bias left out',
  biasEstimate: (caseKnown: boolean, code: string | null): string =>
    `estimated by V/V rated${caseKnown ? ' and case' : ', case unknown'}${code ? '' : `, ${BASIS.unknownDielectric}`}`,
  doesNotLose: (what: string): string => `${what} does not lose with voltage`,
  temperatureCurve: 'temperature curve',
  beyondTemperatureCurve: 'temperature curve, held beyond its end',
  atReference: 'at its reference temperature',
  limits: (code: string): string => `${code} limits`,
  outsideLimits: (code: string, low_C: number, high_C: number): string =>
    `${code} limits, outside its ${celsius(low_C)} … ${celsius(high_C)} °C`,
  unknownLimits: 'dielectric unknown: ±15 % stands in',
  usualDrift: (what: string): string => `usual drift of ${what}`,
  unknownDielectric: 'dielectric unknown: taken as class 2',
  ownRate: 'own rate',
  noAgeing: (what: string): string => `${what} does not age`,
  noAgeingLaw: (what: string): string => `no ageing by hours assumed for ${what}`,
  usualRate: (code: string): string => `usual rate of ${code}`,
  atReferenceAge: 'at the reference age',
  noTolerance: 'no tolerance given',
  letter: (letter: string, end: 'low' | 'nominal' | 'high'): string =>
    `letter ${letter}, ${end === 'nominal' ? 'middle' : `${end} end`}`,
} as const;

const celsius = (temperature: number): string => String(temperature).replace('-', MINUS);
