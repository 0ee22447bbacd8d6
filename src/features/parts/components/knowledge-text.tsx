import type { Knowledge } from '../lib/part-knowledge';

/** What is known, or what stands in: in brass, with the word. */
export function KnowledgeText({ of }: { of: Knowledge }) {
  return of.estimated ? <span className="text-brass">≈ estimated, {of.text}</span> : <span>{of.text}</span>;
}
