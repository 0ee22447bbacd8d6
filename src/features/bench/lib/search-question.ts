import { EngineError } from '@shared/engine/errors';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { Part } from '@shared/schemas/part.schema';
import type { SearchSettings } from '@shared/schemas/rail.schema';
import type { RailDocument } from '@shared/schemas/rail-document.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import type { DraftLine } from './bank-history';
import { searchQuestion } from './mix';

export interface Question {
  asked: RailDocument | null;
  /** Why nothing can be asked. */
  fault: string | null;
}

export const NO_QUESTION: Question = { asked: null, fault: null };

/** What a search would be asked now: all candidates where none are chosen. */
export function askedOf(
  all: readonly Part[],
  spec: RailSpec,
  lines: readonly DraftLine[],
  parts: ReadonlyMap<string, Part>,
  setup: BoardSetup,
  search: SearchSettings,
  inService: boolean,
): Question {
  if (all.length === 0) return NO_QUESTION;
  const settings = { ...search, candidateIds: search.candidateIds ?? all.map((part) => part.id) };
  try {
    return { asked: searchQuestion(spec, lines, parts, setup, settings, inService), fault: null };
  } catch (error) {
    // A part of the bank has no value in service on this rail: nothing can be searched before it goes.
    if (error instanceof EngineError) return { asked: null, fault: error.message };
    throw error;
  }
}
