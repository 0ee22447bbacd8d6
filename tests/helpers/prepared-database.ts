import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll } from 'vitest';
import { seedDemo } from '../../server/db/demo/seed';
import { BoardEntity } from '../../server/db/entities/board.entity';
import { BoardMemberEntity } from '../../server/db/entities/board-member.entity';
import { PersonEntity } from '../../server/db/entities/person.entity';
import { testContext } from './context';
import { DEMO_BOARD, extraKeys, OTHER_BOARD, people } from './people';

const folder = mkdtempSync(path.join(os.tmpdir(), 'millpond-test-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

export const testFolder = (): string => mkdtempSync(path.join(folder, 'run-'));

let prepared: Promise<string> | null = null;

/** A migrated database with the demo data and the extra people, made once for each test file and copied for each test. */
export function preparedDatabase(): Promise<string> {
  prepared ??= prepare();
  return prepared;
}

async function prepare(): Promise<string> {
  const file = path.join(testFolder(), 'prepared.db');
  const ctx = await testContext(file);
  await seedDemo(ctx);
  const now = new Date().toISOString();
  await ctx.db.write(async (manager) => {
    const { passwordHash } = await manager.findOneByOrFail(PersonEntity, { id: people.owner.id });
    for (const key of extraKeys) {
      const { onBoard, ...person } = people[key];
      await manager.insert(PersonEntity, { ...person, passwordHash, createdAt: now, updatedAt: now });
      if (onBoard)
        await manager.insert(BoardMemberEntity, { boardId: DEMO_BOARD, personId: person.id, role: onBoard });
    }
    const ownerId = people.outsider.id;
    const board = { id: OTHER_BOARD, name: 'Other board', ownerId, createdAt: now, updatedAt: now };
    await manager.insert(BoardEntity, board);
    await manager.insert(BoardMemberEntity, { boardId: OTHER_BOARD, personId: ownerId, role: 'engineer' });
  });
  await ctx.db.close();
  return file;
}
