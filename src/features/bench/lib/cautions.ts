import { type Caution, railCautions } from '@shared/rail/cautions';
import { railDocument } from '@shared/rail/document';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { Part } from '@shared/schemas/part.schema';
import type { BankLine } from '@shared/schemas/rail.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { formatQuantity } from '@shared/units/format';
import type { BenchAnalysis } from '@workers/analysis/analysis.interface';

type Shown = Pick<Caution, 'title' | 'text'>;

/** The cautions of rail and bank, and what only the bench knows: states of the library's parts, cavities in the band. */
export function benchCautions(
  spec: RailSpec,
  lines: readonly BankLine[],
  parts: ReadonlyMap<string, Part>,
  setup: BoardSetup,
  analysis: Pick<BenchAnalysis, 'cavity_Hz' | 'extrapolated'> | null,
): Shown[] {
  const cautions: Shown[] = railCautions(railDocument(spec, lines, parts, setup));
  if (analysis?.extrapolated)
    cautions.push({
      title: 'the source’s table ends inside the chart',
      text: 'Beyond its ends the table goes on as the series R–L–C that fits it best: measure further before trusting that stretch.',
    });
  const inBand = (analysis?.cavity_Hz ?? []).filter((f) => f <= spec.band_Hz[1]);
  if (inBand.length > 0)
    cautions.push({
      title: 'plane cavity in the band',
      text: `The plane pair resonates at ${inBand.map((f) => formatQuantity(f, 'Hz')).join(' and ')}: from there on the one-node model does not hold.`,
    });
  return cautions;
}
