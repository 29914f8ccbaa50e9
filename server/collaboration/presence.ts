import { z } from 'zod';
import { PersonHere } from '#shared/contracts/live.ts';

/** Who has a case open at one server process; said again at every change and at every beat. */
export const Presence = z.object({ process: z.string(), number: z.string(), people: z.array(PersonHere) });
export type Presence = z.infer<typeof Presence>;

// A process that has not spoken for three beats is gone, and its people with it.
const silentBeats = 3;

/** What other processes have said of who is there. Knows no clock: beats are counted. */
export class PresenceElsewhere {
  readonly #said = new Map<string, Map<string, { people: readonly PersonHere[]; beats: number }>>();

  hear(presence: Presence): void {
    const ofCase = this.#said.get(presence.number) ?? new Map<string, { people: PersonHere[]; beats: number }>();
    if (presence.people.length === 0) ofCase.delete(presence.process);
    else ofCase.set(presence.process, { people: presence.people, beats: 0 });
    if (ofCase.size === 0) this.#said.delete(presence.number);
    else this.#said.set(presence.number, ofCase);
  }

  peopleIn(number: string): PersonHere[] {
    return [...(this.#said.get(number)?.values() ?? [])].flatMap(({ people }) => people);
  }

  /** @returns the cases from which someone has gone silent */
  beat(): string[] {
    const changed: string[] = [];
    for (const [number, ofCase] of this.#said) {
      for (const [process, said] of ofCase) {
        said.beats += 1;
        if (said.beats <= silentBeats) continue;
        ofCase.delete(process);
        changed.push(number);
      }
    }
    return changed;
  }
}

/** One entry a person: someone at two screens is named once, at the place last told. */
export function onceEach(people: readonly PersonHere[]): PersonHere[] {
  return [...new Map(people.map((person) => [person.id, person])).values()].sort((a, b) => (a.name < b.name ? -1 : 1));
}
