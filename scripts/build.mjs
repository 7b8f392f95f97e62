import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { Unmet } from './fail.mjs';
import { inProject, projectRoot } from './paths.mjs';
import { runNode } from './run.mjs';

const sources = [
  'src',
  'server',
  'shared',
  'migrations',
  'public',
  'index.html',
  'vite.config.ts',
  'package-lock.json',
  'tsconfig.base.json',
];
const stamp = inProject('dist', 'built-from');
const vite = inProject('node_modules', 'vite', 'bin', 'vite.js');

/** Every file below a place, in an order that is the same on every machine. */
function* filesBelow(place) {
  if (!existsSync(place)) return;
  if (!statSync(place).isDirectory()) return void (yield place);
  for (const name of readdirSync(place).sort()) yield* filesBelow(path.join(place, name));
}

/** One hash over names and contents of everything that a build reads. */
function sourcesHash() {
  const hash = createHash('sha256');
  for (const source of sources) {
    for (const file of filesBelow(inProject(source))) {
      hash.update(`${path.relative(projectRoot, file)}\0`).update(readFileSync(file));
    }
  }
  return hash.digest('hex');
}

/** Builds client and server; what was built from half of a change is never taken for whole. */
export async function build() {
  const from = sourcesHash();
  rmSync(stamp, { force: true });
  for (const args of [['build'], ['build', '--ssr']]) {
    const code = await runNode([vite, ...args, '--logLevel', 'warn']);
    if (code !== 0) throw new Unmet('The build did not finish. Its messages are above.');
  }
  writeFileSync(stamp, from);
}

/** Builds unless what stands in dist/ was made from exactly these sources. */
export async function ensureBuilt() {
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === sourcesHash()) return;
  console.log('Building ...');
  await build();
}
