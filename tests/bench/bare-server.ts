import { type ChildProcess, spawn, spawnSync } from 'node:child_process';
import { cpSync, existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { ROOT } from '../setup/stack.mjs';
import { linkPackages } from './link-packages';

const NEXT = 'node_modules/next/dist/bin/next';

/**
 * The same Next on the same Node with next to nothing in it: a static page, a page of no data, a handler that answers
 * at once. It is what the framework alone costs here, and it is no part of the product.
 */
export async function startBareServer(
  folder: string,
  port: number,
): Promise<{ url: string; stop: () => Promise<void> }> {
  const home = join(ROOT, folder, 'bare');
  const env: NodeJS.ProcessEnv = {
    ...process.env,
    BENCH_ROOT: home,
    NEXT_TELEMETRY_DISABLED: '1',
    NODE_ENV: 'production',
  };
  build(home, env);
  const child = spawn(process.execPath, [NEXT, 'start', '-p', String(port)], {
    cwd: home,
    detached: true,
    stdio: ['ignore', 'ignore', 'inherit'],
    env,
  });
  const url = `http://localhost:${port}`;
  for (let tries = 0; !(await fetch(url).catch(() => null))?.ok; tries += 1) {
    if (tries > 150 || child.exitCode !== null) throw new Error('The bare server does not start.');
    await new Promise((done) => setTimeout(done, 200));
  }
  return { url, stop: () => stop(child) };
}

function build(home: string, env: NodeJS.ProcessEnv): void {
  const version = JSON.parse(readFileSync(join(ROOT, 'node_modules/next/package.json'), 'utf8')).version;
  const stamp = join(home, 'built-with');
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === version) return;
  rmSync(home, { recursive: true, force: true });
  cpSync(join(ROOT, 'tests/bench/bare'), home, { recursive: true });
  // Packages of its own: a build whose root is the project takes the project's proxy and start-up in.
  linkPackages(['next', 'react', 'react-dom'], join(ROOT, 'node_modules'), join(home, 'node_modules'));
  console.log('Building the bare server …');
  const done = spawnSync(process.execPath, [NEXT, 'build'], { cwd: home, env, encoding: 'utf8' });
  if (done.status !== 0) throw new Error(`The bare server does not build: ${done.stdout}${done.stderr}`);
  writeFileSync(stamp, version);
}

function stop(child: ChildProcess): Promise<void> {
  return new Promise((done) => {
    if (child.exitCode !== null || !child.pid) return done();
    child.on('exit', () => done());
    process.kill(-child.pid, 'SIGTERM');
  });
}
