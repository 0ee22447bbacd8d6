import type { PartFields, PartState } from '@shared/schemas/part.schema';
import { measuredImpedance, polymerEsr } from './part-curves';
import { bulk, ceramic } from './part-families';

const n = 1e-9;
const u = 1e-6;

/** Spreads that the maker would state for its own parts. */
const spread = (esr_tolerance_percent: number, esl_tolerance_percent: number) => ({
  esr_tolerance_percent,
  esl_tolerance_percent,
});

const hundredNano = ceramic('0402', 'X7R', 100 * n, 16, 0.003, spread(25, 10));

const approved: PartFields[] = [
  ceramic('0201', 'C0G', 100e-12, 25, 0.003),
  ceramic('0201', 'C0G', 1 * n, 25, 0.006),
  ceramic('0201', 'X7R', 10 * n, 10, 0.003),
  ceramic('0201', 'X5R', 100 * n, 6.3, 0.004),
  ceramic('0201', 'X6S', 220 * n, 6.3, 0.006),
  ceramic('0201', 'X5R', 470 * n, 6.3, 0.007),
  ceramic('0201', 'X6S', 1 * u, 4, 0.011),
  ceramic('0201', 'X5R', 2.2 * u, 4, 0.016),
  ceramic('0402', 'C0G', 100e-12, 50, 0.002),
  ceramic('0402', 'C0G', 1 * n, 50, 0.004),
  ceramic('0402', 'C0G', 4.7 * n, 25, 0.012),
  ceramic('0402', 'X7R', 10 * n, 50, 0.002),
  ceramic('0402', 'X7R', 22 * n, 25, 0.003),
  ceramic('0402', 'X7R', 47 * n, 25, 0.003),
  { ...hundredNano, impedance_table: measuredImpedance(hundredNano) },
  ceramic('0402', 'X7R', 220 * n, 16, 0.006),
  ceramic('0402', 'X7R', 470 * n, 10, 0.009, spread(20, 10)),
  ceramic('0402', 'X6S', 1 * u, 10, 0.009),
  ceramic('0402', 'X6S', 2.2 * u, 6.3, 0.014, spread(20, 10)),
  ceramic('0402', 'X5R', 4.7 * u, 6.3, 0.021),
  ceramic('0402', 'X5R', 10 * u, 4, 0.034),
  ceramic('0402', 'X6S', 10 * u, 4, 0.048),
  ceramic('0402', 'X5R', 22 * u, 4, 0.072),
  ceramic('0603', 'C0G', 10 * n, 50, 0.022),
  ceramic('0603', 'X7R', 100 * n, 50, 0.005),
  ceramic('0603', 'X7R', 100 * n, 100, 0.012),
  ceramic('0603', 'X7R', 470 * n, 25, 0.011),
  ceramic('0603', 'X7R', 1 * u, 25, 0.015),
  ceramic('0603', 'X7R', 2.2 * u, 16, 0.022),
  ceramic('0603', 'X5R', 4.7 * u, 10, 0.022),
  ceramic('0603', 'X6S', 10 * u, 6.3, 0.041),
  ceramic('0603', 'X5R', 22 * u, 6.3, 0.058),
  ceramic('0603', 'X6S', 22 * u, 4, 0.081),
  ceramic('0603', 'X5R', 47 * u, 4, 0.14),
  ceramic('0805', 'X7R', 100 * n, 100, 0.014),
  ceramic('0805', 'X7R', 1 * u, 50, 0.026),
  ceramic('0805', 'X7R', 4.7 * u, 16, 0.044),
  ceramic('0805', 'X7R', 10 * u, 10, 0.062),
  ceramic('0805', 'X6S', 22 * u, 6.3, 0.088, spread(20, 10)),
  ceramic('0805', 'X7S', 22 * u, 6.3, 0.112),
  ceramic('0805', 'X5R', 47 * u, 6.3, 0.165),
  ceramic('1206', 'X7R', 1 * u, 100, 0.061),
  ceramic('1206', 'X7R', 2.2 * u, 100, 0.098, { termination: 'soft' }),
  ceramic('1206', 'X7R', 10 * u, 25, 0.094),
  ceramic('1206', 'X5R', 47 * u, 6.3, 0.17),
  ceramic('1206', 'X6S', 100 * u, 4, 0.36),
  ceramic('1210', 'X7S', 4.7 * u, 100, 0.24, { termination: 'soft' }),
  ceramic('1210', 'X7R', 22 * u, 16, 0.23),
  ceramic('1210', 'X5R', 100 * u, 6.3, 0.39),
  bulk('polymer', '7343', 150 * u, 6.3, 0.012, 0.58, spread(30, 15)),
  bulk('polymer', '7343', 220 * u, 6.3, 0.009, 0.66, spread(30, 15)),
  bulk('polymer', '7343', 330 * u, 4, 0.007, 0.74, spread(30, 15)),
  bulk('polymer', '7343', 470 * u, 2.5, 0.006, 0.88, { ...spread(30, 15), esr_table: polymerEsr(0.006) }),
  bulk('tantalum', '7343', 100 * u, 16, 0.075, 0.52),
  bulk('tantalum', '7343', 220 * u, 10, 0.06, 0.61),
  bulk('aluminium', 'D8', 47 * u, 100, 0.32, 0.24),
  bulk('aluminium', 'D10', 100 * u, 100, 0.18, 0.37),
];

const drafts: PartFields[] = [
  ceramic('0402', 'X7S', 4.7 * u, 4, 0.031),
  ceramic('0603', 'X7S', 10 * u, 4, 0.052),
  bulk('polymer', '7343', 560 * u, 2.5, 0.005, 1.02),
];

const retired: PartFields[] = [ceramic('0805', 'X7R', 2.2 * u, 16, 0.03)];

const inState = (state: PartState) => (fields: PartFields) => ({ fields, state });

export const demoParts: { fields: PartFields; state: PartState }[] = [
  ...approved.map(inState('approved')),
  ...drafts.map(inState('draft')),
  ...retired.map(inState('retired')),
];
