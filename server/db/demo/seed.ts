import { searchSettingsSchema } from '@shared/schemas/rail.schema';
import type { EntityManager } from 'typeorm';
import type { Context } from '../../context';
import { touchBoard } from '../../services/board-access';
import { partKeys } from '../../services/part-view';
import { nameKey, storeUsedParts } from '../../services/rail-checks';
import { railResult } from '../../services/rail-results';
import { storeRevision } from '../../services/revision.service';
import { BoardEntity } from '../entities/board.entity';
import { BoardMemberEntity } from '../entities/board-member.entity';
import { PartEntity } from '../entities/part.entity';
import { PersonEntity } from '../entities/person.entity';
import { RailEntity } from '../entities/rail.entity';
import { partsById } from '../repositories/part.repository';
import { demoId } from './demo-id';
import { demoParts } from './parts';
import { DEMO_PASSWORD, demoPeople } from './people';
import { demoRails } from './rails';
import { demoSetup } from './setup';

const board = { id: demoId('board', 'Tide gateway'), name: 'Tide gateway' };
const [engineer] = demoPeople;
const librarian = demoPeople.find((person) => person.siteRole === 'librarian') ?? engineer;
const DAY_MS = 24 * 3600 * 1000;

/** Demo data belongs into an empty house only; where people are already, only the command adds it. */
export async function seedOnFirstRun(ctx: Context): Promise<void> {
  if (await ctx.db.manager.exists(PersonEntity)) return;
  await seedDemo(ctx);
}

/** Adds what is missing of the demo data; what is there, changed or not, stays as it is. */
export async function seedDemo(ctx: Context): Promise<void> {
  const passwordHash = await ctx.passwords.hash(DEMO_PASSWORD);
  await ctx.db.write(async (manager) => {
    const daysAgo = (days: number) => new Date(ctx.now().getTime() - days * DAY_MS).toISOString();
    await seedPeople(manager, passwordHash, daysAgo(9));
    await seedParts(manager, daysAgo(9));
    if (await manager.existsBy(BoardEntity, { id: board.id })) return;
    await seedBoard(manager, daysAgo(8));
    await storeRevision(manager, board, engineer, 'First sizing, from the power budget.', daysAgo(6));
    await seedRails(manager, daysAgo(2), false);
    await storeRevision(manager, board, engineer, 'Core bank made smaller for the new outline.', daysAgo(1));
    await touchBoard(manager, board.id, daysAgo(1));
  });
}

async function seedPeople(manager: EntityManager, passwordHash: string, now: string): Promise<void> {
  for (const { id, name, email, siteRole } of demoPeople) {
    if (await manager.existsBy(PersonEntity, { email })) continue;
    await manager.insert(PersonEntity, {
      id,
      name,
      email,
      siteRole,
      passwordHash,
      demo: true,
      createdAt: now,
      updatedAt: now,
    });
  }
}

async function seedParts(manager: EntityManager, now: string): Promise<void> {
  const known = new Set(
    (await manager.find(PartEntity, { select: { numberKey: true } })).map((p) => p.numberKey),
  );
  const rows = demoParts
    .map(({ fields, state }) => ({
      ...fields,
      ...partKeys(fields),
      state,
      id: demoId('part', fields.partNumber),
      createdAt: now,
      updatedAt: now,
      updatedById: librarian.id,
    }))
    .filter((row) => !known.has(row.numberKey));
  if (rows.length > 0) await manager.insert(PartEntity, rows);
}

async function seedBoard(manager: EntityManager, now: string): Promise<void> {
  await manager.insert(BoardEntity, {
    ...board,
    description: 'Alder Brook Instruments: gauge gateway for tidal stations, carrier board.',
    ownerId: engineer.id,
    setup: demoSetup,
    createdAt: now,
    updatedAt: now,
    updatedById: engineer.id,
  });
  for (const { id, boardRole } of demoPeople)
    if (boardRole)
      await manager.insert(BoardMemberEntity, { boardId: board.id, personId: id, role: boardRole });
  await seedRails(manager, now, true);
}

/** The rails as they were first, or (those that changed) as they are now. */
async function seedRails(manager: EntityManager, now: string, first: boolean): Promise<void> {
  for (const [position, rail] of demoRails.entries()) {
    if (!first && !rail.firstBank) continue;
    const id = demoId('rail', rail.spec.name);
    const lines = first ? (rail.firstBank ?? rail.bank) : rail.bank;
    const bank = lines.map(({ partNumber, ...line }) => ({ ...line, partId: demoId('part', partNumber) }));
    const ids = bank.map((line) => line.partId);
    const result = railResult(rail.spec, bank, await partsById(manager, ids), demoSetup);
    const stored = { bank, ...result, updatedAt: now, updatedById: engineer.id };
    if (first)
      await manager.insert(RailEntity, {
        id,
        boardId: board.id,
        position,
        spec: rail.spec,
        nameKey: nameKey(rail.spec.name),
        search: searchSettingsSchema.parse({
          candidateIds: rail.candidates?.map((number) => demoId('part', number)) ?? null,
        }),
        createdAt: now,
        ...stored,
      });
    else await manager.update(RailEntity, { id }, { ...stored, version: 2 });
    await storeUsedParts(manager, id, bank);
  }
}
