import { linePath_H } from '@shared/rail/network';
import { recipeMount } from '@shared/rail/setup';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { Part } from '@shared/schemas/part.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { formatLength, formatQuantity } from '@shared/units/format';
import type { DraftLine } from '../lib/bank-history';

interface Piece {
  name: string;
  inductance_H: number;
  formula: string;
  source: string;
}

/** Where a line's inductance comes from, piece by piece, with formula and source. */
export function LineInductance({
  line,
  part,
  spec,
  setup,
  shown_H,
}: {
  line: DraftLine;
  part: Part;
  spec: RailSpec;
  setup: BoardSetup;
  /** What the curve was computed with; differs where a worst case takes the ESL to its end. */
  shown_H: number | null;
}) {
  const pieces = piecesOf(line, part, spec, setup);
  const nominal_H = pieces.reduce((sum, piece) => sum + piece.inductance_H, 0);
  if (shown_H !== null && Math.abs(shown_H / nominal_H - 1) > 1e-6)
    pieces.push({
      name: 'ESL tolerance',
      inductance_H: shown_H - nominal_H,
      formula: 'in the worst case shown',
      source: 'library, or ±20 % where it says none',
    });
  const total = pieces.reduce((sum, piece) => sum + piece.inductance_H, 0);
  return (
    <details className="mt-3 text-small">
      <summary className="w-fit text-deep underline-offset-4 hover:underline">
        {formatQuantity(total, 'H')} ={' '}
        {pieces.map((piece) => `${piece.name} ${formatQuantity(piece.inductance_H, 'H')}`).join(' + ')}
      </summary>
      <dl className="mt-1 grid grid-cols-[auto_auto_1fr] gap-x-4">
        {pieces.map((piece) => (
          <div key={piece.name} className="contents">
            <dt>{piece.name}</dt>
            <dd className="text-right">{formatQuantity(piece.inductance_H, 'H')}</dd>
            <dd className="text-stone">
              {piece.formula} <span className="text-stone">({piece.source})</span>
            </dd>
          </div>
        ))}
      </dl>
    </details>
  );
}

function piecesOf(line: DraftLine, part: Part, spec: RailSpec, setup: BoardSetup): Piece[] {
  const esl = { name: 'ESL', inductance_H: part.esl_H, formula: 'of the part alone', source: 'library' };
  return [esl, ...mountPieces(line, part, spec, setup), ...pathPieces(line, spec)];
}

function mountPieces(line: DraftLine, part: Part, spec: RailSpec, setup: BoardSetup): Piece[] {
  if (line.mount_H !== null)
    return [{ name: 'mount', inductance_H: line.mount_H, formula: 'typed in', source: 'this line' }];
  const recipe = setup.recipes.find((one) => one.id === line.recipeId);
  if (recipe && setup.stackup && spec.plane?.geometry?.pair)
    return recipeMount(recipe, spec, setup, line.side).segments.map((segment) => ({
      name: segment.part,
      inductance_H: segment.inductance_H,
      formula: segment.formula,
      source: segment.source,
    }));
  return [
    {
      name: 'mount',
      inductance_H: part.mount_H,
      formula: recipe
        ? 'the part’s usual one: the recipe needs the rail’s planes from the stack-up'
        : 'the part’s usual one',
      source: 'library',
    },
  ];
}

function pathPieces(line: DraftLine, spec: RailSpec): Piece[] {
  const geometry = spec.plane?.geometry;
  if (!geometry || line.distance_m === null) return [];
  const { spacing_m: h, via_radius_m: r1, load_radius_m: r2 } = geometry;
  return [
    {
      name: 'path',
      inductance_H: linePath_H(spec, line.distance_m),
      formula: `μ₀/2π · ${formatLength(h)} · ln((${formatLength(line.distance_m)})² / (${formatLength(r1)} · ${formatLength(r2)}))`,
      source: 'opposite line currents between wide planes',
    },
  ];
}
