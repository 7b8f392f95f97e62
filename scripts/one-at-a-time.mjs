import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { Unmet } from './fail.mjs';
import { isAlive } from './live-pids.mjs';
import { dataFolder } from './paths.mjs';

const note = path.join(dataFolder, 'running.json');

/** Whether the noted process is one of these commands still, and not another that got its number. */
function stillRuns({ pid }) {
  if (!isAlive(pid)) return false;
  const commandLine = `/proc/${pid}/cmdline`;
  return !existsSync(commandLine) || /scripts\/(start|dev)\.mjs/.test(readFileSync(commandLine, 'utf8'));
}

/** Refuses to start a second time in the same folder; two servers on one data folder would take each other's ports. */
export function claimProject() {
  mkdirSync(dataFolder, { recursive: true, mode: 0o700 });
  if (existsSync(note)) {
    const other = JSON.parse(readFileSync(note, 'utf8'));
    if (stillRuns(other)) throw new Unmet(`Headfast runs already in this folder (process ${other.pid}).`);
  }
  writeFileSync(note, JSON.stringify({ pid: process.pid }));
  process.once('exit', () => rmSync(note, { force: true }));
}
