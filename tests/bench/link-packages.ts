import { copyFileSync, existsSync, linkSync, mkdirSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

/** A node_modules with these packages and all they depend on, out of another one; linked where the disk allows. */
export function linkPackages(names: readonly string[], from: string, to: string): void {
  const done = new Set<string>();
  const waiting = [...names];
  for (let name = waiting.pop(); name; name = waiting.pop()) {
    const source = join(from, name);
    if (done.has(name) || !existsSync(source)) continue;
    done.add(name);
    linkFolder(source, join(to, name));
    const { dependencies, optionalDependencies } = JSON.parse(
      readFileSync(join(source, 'package.json'), 'utf8'),
    );
    waiting.push(...Object.keys({ ...dependencies, ...optionalDependencies }));
  }
}

function linkFolder(from: string, to: string): void {
  mkdirSync(to, { recursive: true });
  for (const entry of readdirSync(from, { withFileTypes: true })) {
    const [source, target] = [join(from, entry.name), join(to, entry.name)];
    if (entry.isDirectory()) linkFolder(source, target);
    else if (entry.isFile()) {
      try {
        linkSync(source, target);
      } catch {
        copyFileSync(source, target);
      }
    }
  }
}
