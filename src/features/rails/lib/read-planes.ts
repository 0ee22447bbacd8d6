import { EngineError } from '@shared/engine/errors';
import { planePair } from '@shared/engine/inductance/stackup';
import { planeCapacitance } from '@shared/engine/plane';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { Plane, PlaneGeometry } from '@shared/schemas/rail-spec.schema';
import type { SpecReader } from './spec-reader';

/** The plane pair; `setup` says what lies between two layers of the stack-up. */
export function readPlanes(reader: SpecReader, setup: BoardSetup): Plane | undefined {
  switch (reader.form.planeKind) {
    case 'none':
      return undefined;
    case 'values':
      return { capacitance_F: reader.quantity('planeCapacitance', 'F'), ...seriesOf(reader) };
    case 'dimensions':
      return fromGeometry(reader, {
        spacing_m: reader.length('spacing'),
        relative_permittivity: reader.quantity('permittivity', ''),
      });
    case 'stackup': {
      const { pairUpper, pairLower } = reader.form;
      return fromGeometry(reader, { ...between(reader, setup), pair: [pairUpper, pairLower] });
    }
  }
}

const seriesOf = (reader: SpecReader) => ({
  resistance_ohm: reader.quantityOrZero('planeResistance', 'Ω'),
  inductance_H: reader.quantityOrZero('planeInductance', 'H'),
});

function fromGeometry(
  reader: SpecReader,
  between: Pick<PlaneGeometry, 'spacing_m' | 'relative_permittivity' | 'pair'>,
): Plane {
  const geometry = {
    length_m: reader.length('length'),
    width_m: reader.length('width'),
    via_radius_m: reader.length('viaRadius'),
    load_radius_m: reader.length('loadRadius'),
    ...between,
  };
  const { length_m, width_m, spacing_m, relative_permittivity } = geometry;
  return {
    capacitance_F:
      spacing_m > 0 ? planeCapacitance(length_m, width_m, spacing_m, relative_permittivity) : Number.NaN,
    ...seriesOf(reader),
    geometry,
  };
}

/** What lies between the chosen layers; a choice that the stack-up does not have is said at its field. */
function between(
  reader: SpecReader,
  setup: BoardSetup,
): Pick<PlaneGeometry, 'spacing_m' | 'relative_permittivity'> {
  const { pairUpper, pairLower } = reader.form;
  const fault = pairFault(pairUpper, pairLower, setup);
  if (fault !== null || !setup.stackup) {
    reader.fault('pairUpper', fault ?? NO_STACKUP);
    return { spacing_m: Number.NaN, relative_permittivity: Number.NaN };
  }
  const { spacing_m, relative_permittivity } = planePair(setup.stackup.layers, pairUpper, pairLower);
  return { spacing_m, relative_permittivity };
}

const NO_STACKUP = 'the board has no stack-up to take the planes from';

/** What is wrong with a pair of layers; null: nothing. */
export function pairFault(upper: string, lower: string, setup: BoardSetup): string | null {
  if (!setup.stackup) return NO_STACKUP;
  if (upper === '' || lower === '') return 'choose two planes of the stack-up';
  try {
    planePair(setup.stackup.layers, upper, lower);
    return null;
  } catch (error) {
    if (error instanceof EngineError) return error.message;
    throw error;
  }
}
