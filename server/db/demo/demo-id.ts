import { createHash } from 'node:crypto';

/** The same identifier for the same demo thing on every machine (a version 5 UUID), so that seeding twice adds nothing. */
export function demoId(kind: string, name: string): string {
  const hex = createHash('sha1').update(`millpond demo/${kind}/${name}`).digest('hex');
  const variant = ((Number.parseInt(hex[16], 16) & 0x3) | 0x8).toString(16);
  return [
    hex.slice(0, 8),
    hex.slice(8, 12),
    `5${hex.slice(13, 16)}`,
    variant + hex.slice(17, 20),
    hex.slice(20, 32),
  ].join('-');
}
