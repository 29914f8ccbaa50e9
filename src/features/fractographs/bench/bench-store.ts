import type { BenchState, ShownMark } from './bench-state.ts';
import { step, type Ask, type Move } from './moves.ts';

/** One face on the bench: its state, the marks it stands among, and who is asked to keep what is drawn. */
export class Bench {
  #state: BenchState;
  #marks: readonly ShownMark[] = [];
  readonly #listeners = new Set<() => void>();
  #answer: (ask: Ask) => void = () => undefined;

  constructor(first: BenchState) {
    this.#state = first;
  }

  readonly state = (): BenchState => this.#state;
  readonly subscribe = (tell: () => void): (() => void) => {
    this.#listeners.add(tell);
    return () => this.#listeners.delete(tell);
  };

  /** Who is asked, after a move that drew or moved something, to keep it. */
  answerWith(answer: (ask: Ask) => void): void {
    this.#answer = answer;
  }

  /** The marks that pointer and drawing reckon with. */
  see(marks: readonly ShownMark[]): void {
    this.#marks = marks;
  }

  marks(): readonly ShownMark[] {
    return this.#marks;
  }

  readonly do = (...moves: readonly Move[]): void => {
    const asks: Ask[] = [];
    const before = this.#state;
    for (const move of moves) {
      const { state, ask } = step(this.#state, move, this.#marks);
      this.#state = state;
      if (ask) asks.push(ask);
    }
    for (const ask of asks) this.#answer(ask);
    if (this.#state !== before) for (const tell of this.#listeners) tell();
  };
}
