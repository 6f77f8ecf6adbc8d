import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { run } from './stack.mjs';

const KNOWN = [
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome',
  '/usr/bin/google-chrome-stable',
];

/** A Chromium to drive: one that is there, else Debian's package where we are root, else Playwright's own (null). */
export function ensureChromium() {
  const given = process.env.CHROMIUM_PATH;
  if (given) {
    if (!existsSync(given)) throw new Error(`CHROMIUM_PATH is ${given}, but there is no such file.`);
    return given;
  }
  const found = KNOWN.find((path) => existsSync(path));
  if (found) return found;
  const apt = spawnSync('apt-get', ['--version']).status === 0;
  if (apt && process.getuid?.() === 0) {
    console.log('Installing Chromium from the Debian packages …');
    run('apt-get', ['update', '-qq']);
    run('apt-get', ['install', '-y', '-qq', '--no-install-recommends', 'chromium'], {
      DEBIAN_FRONTEND: 'noninteractive',
    });
    return '/usr/bin/chromium';
  }
  console.log("Installing Playwright's Chromium …");
  run('npx', ['playwright', 'install', 'chromium']);
  return null;
}
