import { uuidv7 } from 'uuidv7';
import type { FractographId } from '#shared/contracts/ids.ts';
import type { Named } from '#shared/contracts/fractographs.ts';
import { MarkView, type MarkDrawn, type MarkSent } from '#shared/contracts/marks.ts';
import type { ProblemBody } from '#shared/contracts/problem.ts';
import { Refusal } from '../../../http/api.ts';
import type { ShownMark } from './bench-state.ts';

// State of the bench and acts sent, events heard: an act shows at once, is sent in its turn, waits while the server is
// out of reach, and when it is refused because of another's change both versions are shown.

export type MarkChange = Partial<Pick<MarkView, 'geometry' | 'certainty' | 'boundary' | 'originCode' | 'note'>>;

type MarkAct =
  | { readonly kind: 'draw'; readonly mark: MarkSent & { id: string } }
  | { readonly kind: 'change'; readonly markId: string; readonly change: MarkChange; readonly versionSeen: number }
  | { readonly kind: 'remove' | 'restore'; readonly markId: string; readonly versionSeen: number };

export type Waiting = { readonly actId: string; readonly act: MarkAct; readonly since: string };

/** How acts reach the server; each answers the mark as kept, or null when it was kept by an earlier try. */
export type MarkCalls = {
  draw(mark: MarkSent, actId: string): Promise<MarkView | null>;
  change(markId: string, change: MarkChange & { versionSeen: number }, actId: string): Promise<MarkView | null>;
  remove(markId: string, versionSeen: number, actId: string): Promise<MarkView | null>;
  restore(markId: string, versionSeen: number, actId: string): Promise<MarkView | null>;
  /** Puts a kept mark where the page reads marks. */
  keep(mark: MarkView): void;
  /** Reads the marks afresh. */
  refetch(): Promise<unknown>;
};

/** One's own change and another's, made at the same time to one mark. */
export type Conflict = { readonly mine: ShownMark; readonly theirs: MarkView };

export type LiveState = {
  readonly waiting: readonly Waiting[];
  readonly conflict: Conflict | null;
  readonly refused: ProblemBody | null;
  /** True while the server does not answer; acts wait. */
  readonly outOfReach: boolean;
  /** Instant of the last act kept, ISO; null before the first. */
  readonly keptAt: string | null;
  /** What was just taken off, while it can be brought back at once. */
  readonly justRemoved: { markId: string; number: number | null } | null;
};

type UndoEntry = { readonly markId: string; readonly back: (now: ShownMark) => MarkAct | null };

const firstState: LiveState = {
  waiting: [],
  conflict: null,
  refused: null,
  outOfReach: false,
  keptAt: null,
  justRemoved: null,
};
const waitsMs = [1000, 2000, 4000, 8000];

/** Marks as they show: those kept, with one's own acts that are still waiting laid over them. */
export function shownMarks(
  kept: readonly MarkView[],
  waiting: readonly Waiting[],
  place: { me: Named; fractographId: FractographId },
): ShownMark[] {
  const shown = new Map<string, ShownMark>(kept.map((mark) => [mark.id, { ...mark, waiting: false }]));
  for (const { act, since } of waiting) {
    if (act.kind === 'draw') {
      if (!shown.has(act.mark.id)) shown.set(act.mark.id, notYetKept(act.mark, place, since));
      continue;
    }
    const before = shown.get(act.markId);
    if (before) shown.set(act.markId, withAct(before, act, { me: place.me, since }));
  }
  return [...shown.values()];
}

function withAct(
  before: ShownMark,
  act: Exclude<MarkAct, { kind: 'draw' }>,
  { me, since }: { me: Named; since: string },
): ShownMark {
  const change = act.kind === 'change' ? act.change : { removed: act.kind === 'remove' };
  const version = Math.max(before.version, act.versionSeen + 1);
  return { ...before, ...change, version, madeBy: me, madeAt: since, waiting: true };
}

function notYetKept(
  mark: MarkSent & { id: string },
  { me, fractographId }: { me: Named; fractographId: FractographId },
  since: string,
): ShownMark {
  const places = { fractographId, versionId: mark.id, version: 1, removed: false, madeBy: me, madeAt: since };
  return { ...mark, ...places, number: null, waiting: true };
}

/** Sends one's own acts in their order and remembers how to undo them. */
export class LiveMarks {
  readonly #calls: MarkCalls;
  readonly #me: Named;
  readonly #listeners = new Set<() => void>();
  readonly #undo: UndoEntry[] = [];
  #state: LiveState = firstState;
  #sending = false;
  #tries = 0;
  #again: ReturnType<typeof setTimeout> | undefined;
  #marks: readonly ShownMark[] = [];
  /** Newest version of each mark that was one's own act; a list read meanwhile may still lack it. */
  readonly #keptVersions = new Map<string, number>();

  constructor(calls: MarkCalls, me: Named) {
    this.#calls = calls;
    this.#me = me;
  }

  readonly subscribe = (tell: () => void): (() => void) => {
    this.#listeners.add(tell);
    return () => this.#listeners.delete(tell);
  };
  readonly state = (): LiveState => this.#state;

  /** What the page shows now; acts are made from it. */
  see(marks: readonly ShownMark[]): void {
    this.#marks = marks;
  }

  draw(drawn: MarkDrawn): string {
    const id = uuidv7();
    this.#undo.push({ markId: id, back: (now) => ({ kind: 'remove', markId: id, versionSeen: now.version }) });
    this.#put({ kind: 'draw', mark: { ...drawn, id } });
    return id;
  }

  change(markId: string, change: MarkChange): void {
    const before = this.#find(markId);
    if (!before) return;
    const back = pick(before, change);
    this.#undo.push({ markId, back: (now) => ({ kind: 'change', markId, change: back, versionSeen: now.version }) });
    this.#put({ kind: 'change', markId, change, versionSeen: before.version });
  }

  remove(markId: string): void {
    const before = this.#find(markId);
    if (!before || before.removed) return;
    this.#undo.push({ markId, back: (now) => ({ kind: 'restore', markId, versionSeen: now.version }) });
    this.#put({ kind: 'remove', markId, versionSeen: before.version });
    this.#set({ justRemoved: { markId, number: before.number } });
  }

  restore(markId: string): void {
    const before = this.#find(markId);
    if (!before || !before.removed) return;
    this.#undo.push({ markId, back: (now) => ({ kind: 'remove', markId, versionSeen: now.version }) });
    this.#put({ kind: 'restore', markId, versionSeen: before.version });
    if (this.#state.justRemoved?.markId === markId) this.#set({ justRemoved: null });
  }

  forgetRemoved(): void {
    this.#set({ justRemoved: null });
  }

  /** Takes back one's own last act. What another has changed since is left alone, and said. */
  undo(): void {
    const last = this.#undo.pop();
    const now = last && this.#find(last.markId);
    if (!last || !now) return;
    if (now.madeBy.id !== this.#me.id) {
      this.#set({ refused: changedSince(now) });
      return;
    }
    const act = last.back(now);
    if (act) this.#put(act);
    this.#set({ justRemoved: null });
  }

  /** Settles a conflict: one's own version follows the other's, or the other's stands. */
  settle(which: 'mine' | 'theirs'): void {
    const { conflict } = this.#state;
    if (!conflict) return;
    this.#set({ conflict: null });
    this.#calls.keep(conflict.theirs);
    if (which === 'theirs') return;
    const { mine, theirs } = conflict;
    if (mine.removed !== theirs.removed) {
      const kind = mine.removed ? 'remove' : 'restore';
      this.#put({ kind, markId: mine.id, versionSeen: theirs.version });
      return;
    }
    const { geometry, certainty, boundary, originCode, note } = mine;
    const change = { geometry, certainty, boundary, originCode, note };
    this.#put({ kind: 'change', markId: mine.id, change, versionSeen: theirs.version });
  }

  dismissRefusal(): void {
    this.#set({ refused: null });
  }

  /** Tries at once what is waiting: the network is back, or the person asks. */
  readonly tryNow = (): void => {
    clearTimeout(this.#again);
    void this.#send();
  };

  close(): void {
    clearTimeout(this.#again);
    this.#listeners.clear();
  }

  /** The mark as it stands after all one has done, however far the page is with drawing and reading it. */
  #find(markId: string): ShownMark | undefined {
    const seen = this.#marks.find(({ id }) => id === markId);
    if (!seen) return undefined;
    const laid = this.#state.waiting.reduce((mark, { act, since }) => this.#with(mark, act, since), seen);
    const keptVersion = this.#keptVersions.get(markId) ?? 0;
    return keptVersion > laid.version ? { ...laid, version: keptVersion, madeBy: this.#me } : laid;
  }

  #with(mark: ShownMark, act: MarkAct, since: string): ShownMark {
    return act.kind === 'draw' || act.markId !== mark.id ? mark : withAct(mark, act, { me: this.#me, since });
  }

  #put(act: MarkAct): void {
    const since = new Date().toISOString();
    this.#set({ waiting: [...this.#state.waiting, { actId: crypto.randomUUID(), act, since }] });
    void this.#send();
  }

  #set(change: Partial<LiveState>): void {
    this.#state = { ...this.#state, ...change };
    for (const tell of this.#listeners) tell();
  }

  async #send(): Promise<void> {
    if (this.#sending) return;
    this.#sending = true;
    try {
      for (let next = this.#state.waiting[0]; next; next = this.#state.waiting[0]) {
        if (!(await this.#sendOne(next))) break;
      }
    } finally {
      this.#sending = false;
    }
  }

  /** @returns false when the rest has to wait */
  async #sendOne(next: Waiting): Promise<boolean> {
    try {
      const kept = await this.#call(next);
      if (kept) {
        this.#keptVersions.set(kept.id, kept.version);
        this.#calls.keep(kept);
      } else await this.#calls.refetch();
      this.#tries = 0;
      const keptAt = new Date().toISOString();
      this.#set({ waiting: without(this.#state.waiting, next), outOfReach: false, keptAt });
      return true;
    } catch (error) {
      return this.#refused(next, error instanceof Refusal ? error.body : null);
    }
  }

  #call({ act, actId }: Waiting): Promise<MarkView | null> {
    switch (act.kind) {
      case 'draw':
        return this.#calls.draw(act.mark, actId);
      case 'change':
        return this.#calls.change(act.markId, { ...act.change, versionSeen: act.versionSeen }, actId);
      default:
        return this.#calls[act.kind](act.markId, act.versionSeen, actId);
    }
  }

  #refused(next: Waiting, body: ProblemBody | null): boolean {
    if (!body || body.code === 'not-now' || body.code === 'not-signed-in') {
      this.#set({ outOfReach: true, ...(body?.code === 'not-signed-in' ? { refused: body } : {}) });
      this.#again = setTimeout(() => void this.#send(), waitsMs[Math.min(this.#tries, waitsMs.length - 1)]);
      this.#tries += 1;
      return false;
    }
    const markId = markOf(next.act);
    const mine = this.#find(markId);
    // what was done after it to the same mark was done to what never came to be
    const waiting = this.#state.waiting.filter(({ act }) => markOf(act) !== markId);
    const theirs = MarkView.safeParse(body.current);
    if (body.code === 'stale-version' && theirs.success && mine) {
      this.#set({ waiting, conflict: { mine, theirs: theirs.data } });
    } else this.#set({ waiting, refused: body });
    void this.#calls.refetch();
    return true;
  }
}

const markOf = (act: MarkAct) => (act.kind === 'draw' ? act.mark.id : act.markId);

const without = (waiting: readonly Waiting[], done: Waiting) => waiting.filter(({ actId }) => actId !== done.actId);

/** Of a mark, what a change names. */
function pick(mark: ShownMark, change: MarkChange): MarkChange {
  const { geometry, certainty, boundary, originCode, note } = mark;
  const all: MarkChange = { geometry, certainty, boundary, originCode, note };
  return Object.fromEntries(Object.entries(all).filter(([field]) => field in change));
}

function changedSince(now: ShownMark): ProblemBody {
  return {
    code: 'stale-version',
    message: `m${now.number ?? ''} has been changed by ${now.madeBy.name} since.`,
    stillHolds: 'Nothing was undone; undo takes back only what is your own.',
  };
}
