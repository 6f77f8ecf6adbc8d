import { spawn, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { DEMO_SECRETS } from './demo-secrets.mjs';

/** The project's folder. Only Node's own modules here: this runs before anything is installed. */
export const ROOT = fileURLToPath(new URL('../..', import.meta.url));
const SOURCES = [
  'app',
  'components',
  'emails',
  'db',
  'lib',
  'next.config.mjs',
  'tailwind.config.ts',
  'postcss.config.mjs',
  'proxy.ts',
  'instrumentation.ts',
  'package-lock.json',
  'tsconfig.json',
];

/** Runs a command to its end with its output shown; throws a sentence when it fails. */
export function run(command, args, env = {}) {
  const done = spawnSync(command, args, { cwd: ROOT, stdio: 'inherit', env: { ...process.env, ...env } });
  if (done.status !== 0)
    throw new Error(`${[command, ...args].join(' ')} ended with ${done.status ?? done.signal}.`);
}

/** Installs what the lockfile names, unless it is there already. */
export function ensureInstalled() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major < 20 || (major === 20 && minor < 19))
    throw new Error(`Node ${process.versions.node} is too old: 20.19 or later is needed.`);
  const installed = join(ROOT, 'node_modules/.package-lock.json');
  const wanted = join(ROOT, 'package-lock.json');
  const stamp = join(ROOT, 'node_modules/.combwood-lock');
  const hash = createHash('sha256').update(readFileSync(wanted)).digest('hex');
  if (existsSync(installed) && existsSync(stamp) && readFileSync(stamp, 'utf8') === hash) return;
  console.log('Installing packages (a few minutes the first time) …');
  run('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error']);
  writeFileSync(stamp, hash);
}

function sourceStamp() {
  const hash = createHash('sha256');
  const walk = (path) => {
    const at = join(ROOT, path);
    if (!existsSync(at)) return;
    if (statSync(at).isDirectory()) for (const name of readdirSync(at).sort()) walk(join(path, name));
    else hash.update(path).update(readFileSync(at));
  };
  for (const path of SOURCES) walk(path);
  return hash.digest('hex');
}

/** Builds for production, unless the build there is of these very sources. */
export function ensureBuilt() {
  const stamp = join(ROOT, '.next/combwood-sources');
  const now = sourceStamp();
  if (existsSync(join(ROOT, '.next/BUILD_ID')) && existsSync(stamp) && readFileSync(stamp, 'utf8') === now)
    return;
  console.log('Building …');
  run(process.execPath, [join(ROOT, 'node_modules/next/dist/bin/next'), 'build'], {
    NEXT_TELEMETRY_DISABLED: '1',
  });
  writeFileSync(stamp, now);
}

/** Where everything listens: the application on `port`, the others on the three ports after it. */
export function places(port) {
  return {
    app: `http://localhost:${port}`,
    pay: `http://localhost:${port + 1}`,
    mail: `http://localhost:${port + 3}`,
    ports: { app: port, pay: port + 1, smtp: port + 2, mail: port + 3 },
  };
}

/** The environment of a local stack whose files lie in `folder`. */
export function stackEnv(port, folder) {
  const at = places(port);
  return {
    ...DEMO_SECRETS,
    NEXT_TELEMETRY_DISABLED: '1',
    COMBWOOD_DB: resolve(ROOT, folder, 'combwood.db'),
    COMBWOOD_FILES: resolve(ROOT, folder, 'files'),
    BASE_URL: at.app,
    PORT: String(port),
    STRIPE_API_URL: at.pay,
    STRIPE_MOCK_PORT: String(at.ports.pay),
    STRIPE_MOCK_URL: at.pay,
    STRIPE_MOCK_MERCHANT: DEMO_SECRETS.MAIL_FROM_NAME,
    STRIPE_MOCK_WEBHOOK_URL: `${at.app}/api/stripe/webhook`,
    STRIPE_MOCK_WEBHOOK_SECRET: DEMO_SECRETS.STRIPE_WEBHOOK_SECRET,
    STRIPE_MOCK_STATE: resolve(ROOT, folder, 'stripe-mock.json'),
    SMTP_URL: `smtp://127.0.0.1:${at.ports.smtp}`,
    MAIL_SMTP_PORT: String(at.ports.smtp),
    MAIL_WEB_PORT: String(at.ports.mail),
    MAIL_STATE: resolve(ROOT, folder, 'mail'),
    RATE_LIMIT_SCALE: '1000',
    LOG_LEVEL: process.env.LOG_LEVEL ?? 'warn',
  };
}

const TSX = [
  join(ROOT, 'node_modules/tsx/dist/cli.mjs'),
  '--tsconfig',
  join(ROOT, 'tests/setup/tsconfig.json'),
];

/** Fills the database once; `fresh` throws away what is there, pictures, payments and mails included. */
export function ensureSeeded(folder, env, fresh) {
  if (fresh) rmSync(resolve(ROOT, folder), { recursive: true, force: true });
  mkdirSync(resolve(ROOT, folder), { recursive: true });
  const stamp = resolve(ROOT, folder, 'seeded');
  if (existsSync(stamp)) return;
  // Half a seed from a run that was stopped is worth nothing.
  for (const name of ['combwood.db', 'combwood.db-wal', 'combwood.db-shm'])
    rmSync(resolve(ROOT, folder, name), { force: true });
  console.log('Filling the database …');
  run(process.execPath, [...TSX, 'db/seed/main.ts'], env);
  writeFileSync(stamp, new Date().toISOString());
}

const isFree = (port) =>
  new Promise((done) => {
    const probe = createServer();
    probe.once('error', () => done(false));
    probe.listen(port, () => probe.close(() => done(true)));
  });

async function waitFor(url, child, name) {
  for (let tries = 0; tries < 300; tries += 1) {
    if (child.exitCode !== null)
      throw new Error(`The ${name} ended while starting (code ${child.exitCode}).`);
    const answer = await fetch(url).catch(() => null);
    if (answer?.ok) return;
    await new Promise((done) => setTimeout(done, 200));
  }
  throw new Error(`The ${name} does not answer at ${url}.`);
}

/**
 * Starts payment service, mail server and application, each in its own process group, and waits until all answer.
 * Returns `stop()`, which ends them all. `reload` runs the application with reload instead of the build.
 */
export async function startStack(port, env, { reload = false, quiet = false } = {}) {
  const at = places(port);
  for (const taken of Object.values(at.ports))
    if (!(await isFree(taken)))
      throw new Error(`Port ${taken} is in use: stop what listens there, or set PORT to another.`);
  const children = [];
  const begin = (args, name) => {
    const child = spawn(process.execPath, args, {
      cwd: ROOT,
      detached: true,
      stdio: ['ignore', quiet ? 'ignore' : 'inherit', 'inherit'],
      env: { ...process.env, ...env },
    });
    children.push(child);
    child.on('exit', (code) => {
      if (!stopping && code) console.error(`The ${name} ended with code ${code}.`);
    });
    return child;
  };
  let stopping = false;
  const stop = async () => {
    stopping = true;
    await Promise.all(
      children.map(
        (child) =>
          new Promise((done) => {
            if (child.exitCode !== null || child.signalCode !== null) return done();
            const late = setTimeout(() => kill(child, 'SIGKILL'), 5000);
            child.on('exit', () => {
              clearTimeout(late);
              done();
            });
            kill(child, 'SIGTERM');
          }),
      ),
    );
  };
  try {
    const next = join(ROOT, 'node_modules/next/dist/bin/next');
    const pay = begin([...TSX, 'tests/fakes/stripe/main.ts'], 'payment service');
    const mail = begin([...TSX, 'tests/fakes/mail/main.ts'], 'mail server');
    const app = begin([next, reload ? 'dev' : 'start', '-H', 'localhost', '-p', String(port)], 'application');
    await waitFor(`${at.pay}/_mock/health`, pay, 'payment service');
    await waitFor(`${at.mail}/api/messages`, mail, 'mail server');
    await waitFor(`${at.app}/api/health`, app, 'application');
  } catch (error) {
    await stop();
    throw error;
  }
  return { stop, at };
}

/** A process group: stopping only the parent would leave the server running. */
function kill(child, signal) {
  try {
    process.kill(-child.pid, signal);
  } catch {
    // Gone already.
  }
}
