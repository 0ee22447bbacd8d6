import { createHash } from 'node:crypto';
import { canonicalJson } from '@shared/formats/canonical-json';
import type { RailDocument } from '@shared/schemas/rail-document.schema';

/** Equal for rails that say the same: specification, bank and the data of its parts. */
export const documentHash = (document: RailDocument): string =>
  createHash('sha256').update(canonicalJson(document)).digest('hex');
