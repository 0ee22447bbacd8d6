import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';

const root = path.resolve(import.meta.dirname, '..');

/** Which folder may import which: nothing goes back (see DEVELOPERS.md). Longest match counts. */
const MAY_IMPORT: Record<string, readonly string[]> = {
  'shared/units': [],
  'shared/engine': ['shared/units'],
  'shared/search': ['shared/engine', 'shared/units'],
  'shared/schemas': ['shared/units'],
  'shared/formats': ['shared/units', 'shared/schemas'],
  'shared/rail': ['shared/units', 'shared/engine', 'shared/search', 'shared/schemas', 'shared/formats'],
  workers: ['shared'],
  server: ['shared', 'package.json'],
  src: ['shared', 'workers'],
};
/** Packages that a folder of `shared` may use; `shared` runs everywhere, so nothing of DOM, Node or a framework. */
const PACKAGES: Record<string, readonly string[]> = {
  'shared/schemas': ['zod'],
  'shared/engine': ['pure-rand'],
};

function files(folder: string): string[] {
  return readdirSync(path.join(root, folder), { withFileTypes: true }).flatMap((entry) => {
    const name = `${folder}/${entry.name}`;
    if (entry.isDirectory()) return files(name);
    return /\.tsx?$/.test(name) && !/\.test\.tsx?$/.test(name) ? [name] : [];
  });
}

/** Where an import leads: a file of this project, or a package's name. */
function target(from: string, specifier: string): string {
  if (specifier.startsWith('@shared/')) return specifier.slice(1);
  if (specifier.startsWith('@workers/')) return specifier.slice(1);
  if (specifier.startsWith('@/')) return `src/${specifier.slice(2)}`;
  if (specifier.startsWith('.'))
    return path.posix.normalize(path.posix.join(path.posix.dirname(from), specifier));
  return `package:${specifier}`;
}

const imports = (file: string): string[] =>
  [
    ...readFileSync(path.join(root, file), 'utf8').matchAll(/(?:from|import)\s*\(?\s*['"]([^'"\n]+)['"]/g),
  ].map((m) => target(file, m[1]));

const zoneOf = (file: string): string =>
  Object.keys(MAY_IMPORT)
    .filter((zone) => file.startsWith(`${zone}/`))
    .sort((a, b) => b.length - a.length)[0] ?? '';

const all = ['shared', 'workers', 'server', 'src'].flatMap(files);

describe('what may import what', () => {
  it('holds for every file', () => {
    const wrong = all.flatMap((file) => {
      const zone = zoneOf(file);
      return imports(file)
        .filter((to) => !to.startsWith('package:'))
        .filter((to) => zoneOf(to) !== zone)
        .filter((to) => !MAY_IMPORT[zone].some((allowed) => to === allowed || to.startsWith(`${allowed}/`)))
        .map((to) => `${file} → ${to}`);
    });
    expect(all.length).toBeGreaterThan(150);
    expect(wrong).toEqual([]);
  });

  it('keeps shared free of DOM, Node and frameworks', () => {
    const wrong = all
      .filter((file) => file.startsWith('shared/'))
      .flatMap((file) =>
        imports(file)
          .filter((to) => to.startsWith('package:'))
          .filter((to) => !(PACKAGES[zoneOf(file)] ?? []).includes(to.slice('package:'.length).split('/')[0]))
          .map((to) => `${file} → ${to}`),
      );
    expect(wrong).toEqual([]);
  });

  it('keeps features apart and components free of them', () => {
    const featureOf = (file: string) => /^src\/features\/([^/]+)\//.exec(file)?.[1];
    const wrong = all
      .filter((file) => file.startsWith('src/') && !file.startsWith('src/app/'))
      .flatMap((file) =>
        imports(file)
          .filter((to) => featureOf(to) !== undefined && featureOf(to) !== featureOf(file))
          .map((to) => `${file} → ${to}`),
      );
    expect(wrong).toEqual([]);
  });

  it('lets only interfaces and clients of workers into the page', () => {
    const wrong = all
      .filter((file) => file.startsWith('src/'))
      .flatMap((file) =>
        imports(file)
          .filter(
            (to) =>
              to.startsWith('workers/') &&
              !/\.(interface|client)$/.test(to) &&
              !to.startsWith('workers/host/answer'),
          )
          .map((to) => `${file} → ${to}`),
      );
    expect(wrong).toEqual([]);
  });

  it('keeps entities inside the server’s db, services and mail outbox', () => {
    const wrong = all
      .filter(
        (file) => file.startsWith('server/') && !/^server\/(db|services|mail|cli|[a-z-]+\.ts)/.test(file),
      )
      .flatMap((file) =>
        imports(file)
          .filter((to) => to.includes('/entities/') || to.endsWith('.entity'))
          .map((to) => `${file} → ${to}`),
      );
    expect(wrong).toEqual([]);
  });
});
