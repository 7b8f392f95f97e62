import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { Unmet } from './fail.mjs';
import { inProject } from './paths.mjs';
import { run } from './run.mjs';

const readPackages = (file) => (existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')).packages : undefined);

/**
 * npm writes what it installed to a hidden lock file when it has finished, so comparing the two tells a
 * missing, an outdated and a half-finished installation alike. Optional packages of other platforms are absent by design.
 */
function packagesMatchLock() {
  const wanted = readPackages(inProject('package-lock.json'));
  const installed = readPackages(inProject('node_modules', '.package-lock.json'));
  if (!installed) return false;
  return Object.entries(wanted).every(([place, entry]) => {
    if (place === '') return true;
    const found = installed[place];
    return found ? found.version === entry.version : entry.optional === true;
  });
}

/** Installs the packages of package-lock.json unless exactly these are there. */
export async function ensurePackages() {
  if (packagesMatchLock()) return;
  console.log('Installing packages (npm ci) ...');
  const npm = process.env.npm_execpath;
  const args = ['ci', '--include=dev', '--no-audit', '--no-fund'];
  const code = npm ? await run(process.execPath, [npm, ...args]) : await run('npm', args);
  if (code !== 0) throw new Unmet('npm ci did not finish. Its messages are above.');
}

const systemFolders = ['/usr/local/sbin', '/usr/local/bin', '/usr/sbin', '/usr/bin', '/sbin', '/bin'];

/** Full path of a program, looked for on PATH and in the system's folders (sbin is often not on a person's PATH). */
export function findProgram(...names) {
  const folders = [...(process.env.PATH ?? '').split(path.delimiter), ...systemFolders];
  for (const name of names) {
    const folder = folders.find((each) => each !== '' && existsSync(path.join(each, name)));
    if (folder) return path.join(folder, name);
  }
  return undefined;
}

/**
 * Makes sure that programs of a Debian package are there. Root installs it; anybody else is told what to install.
 * @param {string} debianPackage
 * @param {string[]} programs all of which must be found
 */
export async function ensureDebianPackage(debianPackage, programs) {
  const missing = () => programs.filter((each) => !findProgram(each));
  if (missing().length === 0) return;
  const byHand = `Install it and run this again:\n  sudo apt-get update && sudo apt-get install -y ${debianPackage}`;
  if (process.getuid?.() !== 0) throw new Unmet(`${missing().join(' and ')} is not on this machine. ${byHand}`);
  if (!findProgram('apt-get')) throw new Unmet(`${debianPackage} is not on this machine, and neither is apt-get.`);
  console.log(`Installing ${debianPackage} (apt-get) ...`);
  const env = { DEBIAN_FRONTEND: 'noninteractive' };
  const apt = ['-qq', '-o', 'Dpkg::Use-Pty=0'];
  const updated = await run('apt-get', [...apt, 'update'], { env });
  const installed = updated === 0 ? await run('apt-get', [...apt, 'install', '-y', debianPackage], { env }) : updated;
  if (installed !== 0 || missing().length > 0) throw new Unmet(`apt-get could not install ${debianPackage}. ${byHand}`);
}
