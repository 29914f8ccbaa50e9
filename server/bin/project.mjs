import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The project folder, wherever the command was called from. */
export const projectFolder = dirname(dirname(dirname(fileURLToPath(import.meta.url))));

/** A path inside the project. */
export function inProject(...parts) {
  return join(projectFolder, ...parts);
}
