import { EngineError } from '@shared/engine/errors';
import { resolveSpec } from '@shared/rail/setup';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { Part } from '@shared/schemas/part.schema';
import type { BankLine, SearchSettings } from '@shared/schemas/rail.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { type EntityManager, Not } from 'typeorm';
import { RailEntity } from '../db/entities/rail.entity';
import { RailPartEntity } from '../db/entities/rail-part.entity';
import { partsById } from '../db/repositories/part.repository';
import { invalid } from '../errors/problems';

export const nameKey = (name: string): string => name.normalize('NFC').toLowerCase();

export async function requireFreeName(
  manager: EntityManager,
  boardId: string,
  railId: string,
  name: string,
): Promise<void> {
  if (await manager.existsBy(RailEntity, { boardId, nameKey: nameKey(name), id: Not(railId) }))
    throw invalid([{ path: 'spec.name', message: 'another rail of this board has this name' }]);
}

/** The parts of bank and search; a part that the library does not have is a fault of its line. */
export async function checkedParts(
  manager: EntityManager,
  bank: readonly BankLine[],
  search: SearchSettings,
): Promise<Map<string, Part>> {
  const candidates = search.candidateIds ?? [];
  const parts = await partsById(manager, [...bank.map((line) => line.partId), ...candidates]);
  const unknown = 'the library has no such part';
  const faults = [
    ...bank.flatMap((line, i) =>
      parts.has(line.partId) ? [] : [{ path: `bank[${i}].partId`, message: unknown }],
    ),
    ...candidates.flatMap((id, i) =>
      parts.has(id) ? [] : [{ path: `search.candidateIds[${i}]`, message: unknown }],
    ),
  ];
  if (faults.length > 0) throw invalid(faults.slice(0, 50));
  return parts;
}

/** The specification with its planes as the board's stack-up has them. */
export function planesFrom(spec: RailSpec, setup: BoardSetup): RailSpec {
  try {
    return resolveSpec(spec, setup);
  } catch (error) {
    if (!(error instanceof EngineError)) throw error;
    throw invalid([{ path: 'spec.plane.geometry.pair', message: error.message }]);
  }
}

export function requireRecipes(bank: readonly BankLine[], setup: BoardSetup): void {
  const known = new Set(setup.recipes.map((recipe) => recipe.id));
  const faults = bank.flatMap((line, i) =>
    line.recipeId === null || known.has(line.recipeId)
      ? []
      : [{ path: `bank[${i}].recipeId`, message: 'the board has no such mount recipe' }],
  );
  if (faults.length > 0) throw invalid(faults.slice(0, 50));
}

export async function storeUsedParts(
  manager: EntityManager,
  railId: string,
  bank: readonly BankLine[],
): Promise<void> {
  const partIds = [...new Set(bank.map((line) => line.partId))];
  await manager.delete(RailPartEntity, { railId });
  if (partIds.length > 0)
    await manager.insert(
      RailPartEntity,
      partIds.map((partId) => ({ railId, partId })),
    );
}
