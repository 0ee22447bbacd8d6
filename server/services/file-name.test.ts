import { expect, it } from 'vitest';
import { fileSafe } from './file-name';

it.each([
  ['Tide gateway', 'tide-gateway'],
  ['../../etc/passwd', 'etc-passwd'],
  ['Größe 3,3 V', 'gro-e-3-3-v'],
  ['"; rm -rf "', 'rm--rf'],
  ['水', 'unnamed'],
  ['...', 'unnamed'],
])('makes %j into %j', (name, safe) => {
  expect(fileSafe(name)).toBe(safe);
});
