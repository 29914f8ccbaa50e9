import { createHash } from 'node:crypto';
import { CaseNumber } from '#shared/contracts/ids.ts';
import type { Person } from '#shared/contracts/people.ts';
import type { CaseAct } from '#shared/rules/may.ts';
import {
  contextFor,
  visitorContext,
  type Context,
  type ContextParts,
  type VisitorContext,
} from '../../http/context.ts';
import { Problem } from '../../http/problem.ts';
import { openCase, type HeldFor } from '../../rights/open-case.ts';
import type { DemoMail } from './people.ts';
import { StoryClock } from './story-clock.ts';

const minutesAnAct = 4;

type Act<Of extends CaseAct> = {
  readonly name: string;
  readonly by: DemoMail;
  readonly code: string;
  readonly act: Of;
};

/**
 * The people of the demo at work: each act is done once, by its person, at its time of the story. An act's id comes from
 * its name, so that a story broken off is told again from its beginning and only what is missing is done.
 */
export class Hands {
  readonly clock = new StoryClock();
  readonly #parts: ContextParts;
  readonly #people = new Map<string, Person>();
  readonly #isResuming: boolean;

  constructor(parts: ContextParts, isResuming: boolean) {
    this.#parts = { ...parts, clock: this.clock.now };
    this.#isResuming = isResuming;
  }

  admit(person: Person): void {
    this.#people.set(person.mail, person);
  }

  person(mail: DemoMail): Person {
    const person = this.#people.get(mail);
    if (!person) throw new Error(`${mail} has no account`);
    return person;
  }

  /** For what has no doer yet: the first organisations and accounts. */
  get visitor(): VisitorContext {
    return visitorContext(this.#parts);
  }

  /** The context a person reads in; nothing done in it is told apart from doing it again. */
  reading(mail: DemoMail): Context {
    return contextFor(this.person(mail), this.#parts);
  }

  /** Does an act unless it was done before the story broke off. */
  async once(name: string, by: DemoMail, work: (context: Context) => Promise<unknown>): Promise<void> {
    this.clock.passMinutes(minutesAnAct);
    const context = contextFor(this.person(by), { ...this.#parts, actId: actIdOf(name) });
    if (this.#isResuming && (await wasDone(context))) return;
    await work(context);
  }

  /** The same in a case, held for the act. */
  onceIn<Of extends CaseAct>(
    { name, by, code, act }: Act<Of>,
    work: (context: Context, heldCase: HeldFor<Of>) => Promise<unknown>,
  ): Promise<void> {
    return this.once(`${code} ${name}`, by, async (context) =>
      work(context, await openCase(context, numberOf(code), act)),
    );
  }

  /** A case, held by a person for reading. */
  look(code: string, by: DemoMail): Promise<HeldFor<'read'>> {
    return openCase(this.reading(by), numberOf(code), 'read');
  }

  /** Whether an act was done already. */
  async didOnce(name: string, by: DemoMail): Promise<boolean> {
    return wasDone(contextFor(this.person(by), { ...this.#parts, actId: actIdOf(name) }));
  }
}

export function numberOf(code: string): CaseNumber {
  return CaseNumber.parse(`HB-2026-${code}`);
}

class OnlyAsked extends Error {}

/** Claims the act's id and gives it back at once: refused, it was done before. */
async function wasDone(context: Context): Promise<boolean> {
  try {
    await context.inTransaction(() => Promise.reject(new OnlyAsked()));
  } catch (error) {
    if (error instanceof OnlyAsked) return false;
    if (error instanceof Problem && error.code === 'already-done') return true;
    throw error;
  }
  return false;
}

/** A UUID (version 8) that is always the same for one name. */
function actIdOf(name: string): string {
  const hex = createHash('sha256').update(`demo act ${name}`).digest('hex');
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-8${hex.slice(13, 16)}-8${hex.slice(17, 20)}-${hex.slice(20, 32)}`;
}
