import type { ContextParts, VisitorContext } from '../http/context.ts';
import { listAccounts } from '../features/people/service/list-people.ts';
import { enterMaterials, enterScales, foundLaboratory } from './demo/found-laboratory.ts';
import { Hands } from './demo/hands.ts';
import { demoOrganisations, demoPassword, demoPeople } from './demo/people.ts';
import { scenesOf } from './demo/story.ts';

export { demoPassword };

export type SeedOptions = {
  /** Told of each case as its images are in: "Demo: case 4 of 12". */
  readonly onProgress?: (words: string) => void;
  /** Makes every pixel so many times larger, so that tests draw small images of the same pieces; 1 unless told. */
  readonly pixelFactor?: number;
};

const lastPerson = 'administrator@marrowdene.example';
const lastAct = 'the story is told';

/**
 * Tells the demo into an empty database by acting through the services, as its people on their days of 2026. Broken off,
 * it goes on at the next start; a database of another laboratory is left alone.
 * @returns the lines that say which accounts there are
 */
export async function seedDemo(
  parts: ContextParts,
  context: VisitorContext,
  { onProgress = () => undefined, pixelFactor = 1 }: SeedOptions = {},
): Promise<string[]> {
  const { accounts } = await listAccounts(context);
  const isOwn = accounts.length > 0 && !accounts.some(({ mail }) => demoPeople.some((person) => person.mail === mail));
  if (isOwn) return ['This database holds a laboratory of its own; the demo was left out.'];
  const hands = new Hands(parts, accounts.length > 0);
  const usualClock = parts.clock;
  // The server's own jobs, too, go by the days of the story while it is told.
  parts.clock = hands.clock.now;
  try {
    await tell(hands, { onProgress, pixelFactor });
  } catch (error) {
    const why = error instanceof Error ? error.message : String(error);
    return [`The demo is there only in part: ${why}. The next start goes on with it.`, ...accountLines()];
  } finally {
    parts.clock = usualClock;
  }
  return accountLines();
}

async function tell(hands: Hands, { onProgress, pixelFactor }: Required<SeedOptions>): Promise<void> {
  await foundLaboratory(hands);
  if (await hands.didOnce(lastAct, lastPerson)) return;
  await enterMaterials(hands);
  await enterScales(hands, pixelFactor);
  for (const scene of scenesOf(hands, pixelFactor)) {
    if (scene.says) onProgress(`Demo: ${scene.says}`);
    hands.clock.set(scene.on, scene.at);
    await scene.play();
  }
  await hands.once(lastAct, lastPerson, (context) => context.inTransaction(() => Promise.resolve()));
}

function accountLines(): string[] {
  return [
    `Demo accounts, all with the password "${demoPassword}":`,
    ...demoOrganisations.flatMap(({ name }) => [
      `${name}`,
      ...demoPeople
        .filter(({ organisation }) => organisation === name)
        .map(({ mail, name: person, roles }) => `  ${mail} (${roles.join(', ')}), ${person}`),
    ]),
  ];
}
