export interface TextPiece {
  text: string;
  /** Where it leads, when it is an address. */
  href: string | null;
}

/** Only web addresses become links; a full stop or bracket after one is not part of it. */
const ADDRESS = /https?:\/\/[^\s<>"]+/g;
const TRAILING = /[.,;:!?)\]]+$/;

/** Cuts plain text into what leads somewhere and what does not; joined again it is the same text. */
export function textPieces(text: string): TextPiece[] {
  const pieces: TextPiece[] = [];
  let at = 0;
  for (const match of text.matchAll(ADDRESS)) {
    const href = match[0].replace(TRAILING, '');
    if (!URL.canParse(href)) continue;
    if (match.index > at) pieces.push({ text: text.slice(at, match.index), href: null });
    pieces.push({ text: href, href });
    at = match.index + href.length;
  }
  if (at < text.length) pieces.push({ text: text.slice(at), href: null });
  return pieces;
}
