import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test, vi } from 'vitest';
import { PERMISSIONS, type Permission, type PermissionRule } from '@/lib/domain/access/permissions';

vi.mock('next/headers', async () => (await import('../../setup/fake-request')).nextHeaders);

// ASVS 5.0, 8.2.1: every way in names what it needs. Files are found by walking, so that a new one is covered.
const FILES = readdirSync('app', { recursive: true, encoding: 'utf8' }).map((name) => join('app', name));
const ACTIONS = FILES.filter((name) => name.endsWith('/actions.ts'));
const ROUTES = FILES.filter((name) => name.endsWith('/route.ts'));
const METHODS = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS'];

/** Inline server functions (`'use server'` inside a function), each with the reason it carries no access of its own. */
const INLINE: Record<string, string> = {
  'app/_components/site-shell.tsx': 'hands its form to signOutAction, whose ladder runs',
};

type Door = { access?: { permission?: Permission; on?: string | null } };

function check(name: string, value: unknown): void {
  const { access } = value as Door;
  expect(access, `${name} has no access`).toBeDefined();
  const permission = access?.permission;
  expect(Object.keys(PERMISSIONS), `${name} asks for ${permission}`).toContain(permission);
  const rule: PermissionRule = PERMISSIONS[permission as Permission];
  const kind = 'on' in rule ? rule.on : null;
  expect(access?.on ?? null, `${name} asks ${permission} on the wrong kind of row`).toBe(kind);
}

test('there are doors to look at', () => {
  expect(ACTIONS.length).toBeGreaterThan(10);
  expect(ROUTES.length).toBeGreaterThan(4);
});

describe.each(ACTIONS)('%s', (file) => {
  test('every export asks for a permission on the kind of row it is about', async () => {
    const module: Record<string, unknown> = await import(join(process.cwd(), file));
    for (const [name, value] of Object.entries(module)) check(`${file} ${name}`, value);
  });
});

describe.each(ROUTES)('%s', (file) => {
  test('every method asks for a permission on the kind of row it is about', async () => {
    const module: Record<string, unknown> = await import(join(process.cwd(), file));
    const methods = Object.entries(module).filter(([name]) => METHODS.includes(name));
    expect(methods.length).toBeGreaterThan(0);
    for (const [name, value] of methods) check(`${file} ${name}`, value);
  });
});

test('no server function hides outside actions.ts', () => {
  const hidden = FILES.filter((name) => /\.tsx?$/.test(name) && !name.endsWith('/actions.ts')).filter(
    (name) => /^\s*'use server';/m.test(readFileSync(name, 'utf8')),
  );
  expect(hidden.sort()).toEqual(Object.keys(INLINE).sort());
  const elsewhere = ['components', 'lib'].flatMap((room) =>
    readdirSync(room, { recursive: true, encoding: 'utf8' })
      .map((name) => join(room, name))
      .filter((name) => /\.tsx?$/.test(name) && /^\s*'use server';/m.test(readFileSync(name, 'utf8'))),
  );
  expect(elsewhere).toEqual([]);
});
