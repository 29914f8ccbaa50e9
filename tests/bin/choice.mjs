import { Failure } from '../../server/bin/failure.mjs';

export const PROJECTS = ['unit', 'reference', 'api', 'journeys'];
export const CHECKS = ['format', 'lint', 'types'];

/**
 * Reads what to run: everything, or with `--only NAME` one check or project, or the test files whose path contains
 * one of the given words.
 * @param {string[]} words the command's parameters
 * @returns {{ checks: string[], projects: string[], paths: string[] }}
 */
export function readChoice(words) {
  const only = [];
  const paths = [];
  for (let at = 0; at < words.length; at += 1) {
    if (words[at] === '--only') only.push(...(words[(at += 1)] ?? '').split(','));
    else paths.push(words[at]);
  }
  const known = [...CHECKS, ...PROJECTS];
  const unknown = only.find((name) => !known.includes(name)) ?? paths.find((path) => path.startsWith('-'));
  if (unknown !== undefined) {
    throw new Failure(`"${unknown}" is nothing that can be tested.`, `Use npm test -- --only ${known.join('|')}`);
  }
  const chosen = (names) => names.filter((name) => only.includes(name));
  if (only.length > 0) return { checks: chosen(CHECKS), projects: chosen(PROJECTS), paths };
  if (paths.length === 0) return { checks: CHECKS, projects: PROJECTS, paths };
  // Only the journeys need the built product, which takes its time.
  const wantsJourneys = paths.some((path) => path.includes('journeys'));
  return { checks: [], projects: PROJECTS.filter((name) => wantsJourneys || name !== 'journeys'), paths };
}
