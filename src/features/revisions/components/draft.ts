import type { Rail } from '@shared/schemas/rail.schema';

/** The board as it stands, against its latest revision. */
export interface Draft {
  total: number;
  latest: string | null;
  next: string;
  /** Rails that a person edited since the latest revision, by name. */
  edited: string[];
  /** Rails whose results changed because a part they use was changed. */
  byParts: number;
  short: string[];
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

export function draftOf(
  rails: readonly Rail[],
  latest: { letter: string; createdAt: string } | null,
  changedRails: number,
): Draft {
  const edited = latest ? rails.filter((rail) => rail.updatedAt > latest.createdAt) : [];
  return {
    total: rails.length,
    latest: latest?.letter ?? null,
    next: nextLetter(latest?.letter ?? null),
    edited: edited.map((rail) => rail.spec.name),
    byParts: latest ? Math.max(0, changedRails - edited.length) : 0,
    short: rails.filter((rail) => rail.summary.holds === false).map((rail) => rail.spec.name),
  };
}
