import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The project's folder, wherever the command was called from. */
export const projectRoot = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '..');

/** Where this installation keeps what git does not: database, keys, logs. */
export const dataFolder = path.join(projectRoot, '.data');

/** A path inside the project. */
export const inProject = (...parts) => path.join(projectRoot, ...parts);
