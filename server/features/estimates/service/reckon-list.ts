import type { Reckoning, ReckoningsWanted } from '#shared/contracts/reckonings.ts';
import { isMonteCarlo, reckonListed } from '#shared/rules/reckon-listed.ts';

// Together in one request, so that no request holds the others up for much more than half a second.
const mostDrawsTogether = 400_000;

/** Reckons a list of methods in its order and keeps nothing; what cannot be reckoned is refused in its place. */
export function reckonList(wanted: ReckoningsWanted): Reckoning[] {
  const drawn = wanted.filter(({ method }) => isMonteCarlo(method)).length;
  const mostDraws = Math.floor(mostDrawsTogether / Math.max(1, drawn));
  return wanted.map((each) => reckonListed(each, { mostDraws }));
}
