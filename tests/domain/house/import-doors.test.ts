import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { dirname, join, posix, relative } from 'node:path';
import { expect, test } from 'vitest';

const ROOMS = ['app', 'components', 'emails', 'db', 'lib'].filter((room) => existsSync(room));

// A room may import itself and the rooms beside it here. The longest matching prefix is the room.
const DOORS: Record<string, string[]> = {
  app: ['components', 'lib/server', 'lib/schemas', 'lib/domain', 'lib/client'],
  components: ['lib/client', 'lib/schemas', 'lib/domain'],
  emails: ['lib/domain'],
  'lib/client': ['lib/domain', 'lib/schemas'],
  'lib/server': ['lib/domain', 'lib/schemas', 'db', 'emails'],
  'lib/schemas': ['lib/domain'],
  'lib/domain': [],
  // Seeding goes through the same use-cases as people do.
  'db/seed': ['db', 'lib/server', 'lib/domain'],
  db: ['lib/domain'],
};
// Pure packages a domain file may use; anything else there is a wrong door.
const DOMAIN_PACKAGES = ['temporal-polyfill', 'currency-codes', 'libphonenumber-js', 'tonal'];

const roomOf = (file: string): string =>
  Object.keys(DOORS)
    .filter((room) => file === room || file.startsWith(`${room}/`))
    .sort((a, b) => b.length - a.length)[0] ?? '';

const files = ROOMS.flatMap((room) =>
  readdirSync(room, { recursive: true, encoding: 'utf8' })
    .map((name) => posix.join(room, name.replaceAll('\\', '/')))
    .filter((name) => /\.tsx?$/.test(name)),
);

const importsOf = (file: string): string[] =>
  [...readFileSync(file, 'utf8').matchAll(/(?:from|import)\s*\(?\s*'([^']+)'/g)].map(
    (found) => found[1] ?? '',
  );

const target = (file: string, spec: string): string | null => {
  if (spec.startsWith('@/')) return spec.slice(2);
  if (spec.startsWith('.'))
    return posix.normalize(relative('.', join(dirname(file), spec)).replaceAll('\\', '/'));
  return null;
};

test('imports go through the doors only', () => {
  const wrong: string[] = [];
  for (const file of files) {
    const from = roomOf(file);
    for (const spec of importsOf(file)) {
      const to = target(file, spec);
      if (to === null) {
        if (
          from === 'lib/domain' &&
          !DOMAIN_PACKAGES.some((name) => spec === name || spec.startsWith(`${name}/`))
        )
          wrong.push(`${file} → package ${spec}`);
        continue;
      }
      const into = roomOf(to);
      if (into !== from && !DOORS[from]?.includes(into)) wrong.push(`${file} → ${to}`);
    }
  }
  expect(files.length).toBeGreaterThan(50);
  expect(wrong).toEqual([]);
});

test('imports have no cycles', () => {
  const known = new Set(files);
  const resolve = (path: string) => [path, `${path}.ts`, `${path}.tsx`].find((name) => known.has(name));
  const edges = new Map(
    files.map((file) => [
      file,
      [
        ...readFileSync(file, 'utf8').matchAll(/^(?:import|export)\s+(?!type\s)[^;]*?from\s+'([^']+)'/gm),
      ].flatMap((found) => {
        const to = target(file, found[1] ?? '');
        const hit = to === null ? undefined : resolve(to);
        return hit ? [hit] : [];
      }),
    ]),
  );
  const done = new Set<string>();
  const cycles: string[] = [];
  const walk = (file: string, path: string[]): void => {
    if (path.includes(file)) cycles.push([...path.slice(path.indexOf(file)), file].join(' → '));
    if (done.has(file) || path.includes(file)) return;
    for (const next of edges.get(file) ?? []) walk(next, [...path, file]);
    done.add(file);
  };
  for (const file of files) walk(file, []);
  expect(cycles).toEqual([]);
});

test('server rooms are marked server-only', () => {
  const unmarked = files.filter(
    (file) => file.startsWith('lib/server/') && !readFileSync(file, 'utf8').includes("import 'server-only'"),
  );
  expect(unmarked).toEqual([]);
});
