import { canonicalJson } from '@shared/formats/canonical-json';
import { railDocument } from '@shared/rail/document';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { RailList, RailSummary } from '@shared/schemas/rail.schema';
import type { RailDocument } from '@shared/schemas/rail-document.schema';
import type { RevisionDetail } from '@shared/schemas/revision.schema';

/** The board as it stands, against its latest revision; rails by name. */
export interface Draft {
  total: number;
  latest: string | null;
  next: string;
  added: string[];
  /** Specification or bank differ. */
  edited: string[];
  /** Only the data of parts that they use differ. */
  byParts: string[];
  /** In the revision, and no longer on the board. */
  deleted: string[];
  /** In service; then those that are short in their worst case, and with one part open. */
  short: string[];
  worst: string[];
  missing: string[];
  /** Rails that have no result, e.g. since nothing feeds them. */
  unknown: string[];
}

/** The letter after `letter`: A … Z, AA, AB … */
export function nextLetter(letter: string | null): string {
  if (letter === null) return 'A';
  const digits = [...letter];
  for (let i = digits.length - 1; i >= 0; i--) {
    if (digits[i] !== 'Z') {
      digits[i] = String.fromCharCode(digits[i].charCodeAt(0) + 1);
      return digits.join('');
    }
    digits[i] = 'A';
  }
  return `A${digits.join('')}`;
}

type Latest = Pick<RevisionDetail, 'letter'> & {
  railResults: readonly Pick<RevisionDetail['railResults'][number], 'railId' | 'document'>[];
};

const namesOf = (rails: RailList['rails'], picks: (summary: RailSummary) => boolean): string[] =>
  rails.filter((rail) => picks(rail.summary)).map((rail) => rail.spec.name);

const own = ({ rail, bank }: RailDocument): string => canonicalJson({ rail, bank });

/** Compares what the rails say, not when they were saved: an edit that was taken back is none. */
export function draftOf({ rails, parts }: RailList, setup: BoardSetup, latest: Latest | null): Draft {
  const byId = new Map(parts.map((part) => [part.id, part]));
  const here = new Set(rails.map((rail) => rail.id));
  const cut = new Map(latest?.railResults.map(({ railId, document }) => [railId, document]));
  const draft: Draft = {
    total: rails.length,
    latest: latest?.letter ?? null,
    next: nextLetter(latest?.letter ?? null),
    added: [],
    edited: [],
    byParts: [],
    deleted: [...cut].filter(([id]) => !here.has(id)).map(([, document]) => document.rail.name),
    short: namesOf(rails, (summary) => summary.holds === false),
    worst: namesOf(rails, (summary) => summary.worst?.holds === false),
    missing: namesOf(rails, (summary) => summary.missing?.holds === false),
    unknown: namesOf(rails, (summary) => summary.holds === null),
  };
  for (const { id, spec, bank } of rails) {
    const now = railDocument(spec, bank, byId, setup);
    const then = cut.get(id);
    if (!then) draft.added.push(spec.name);
    else if (own(now) !== own(then)) draft.edited.push(spec.name);
    else if (canonicalJson(now) !== canonicalJson(then)) draft.byParts.push(spec.name);
  }
  return draft;
}
