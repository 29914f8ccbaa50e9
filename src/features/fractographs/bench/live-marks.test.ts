import { describe, expect, it } from 'vitest';
import { FractographId } from '#shared/contracts/ids.ts';
import type { MarkDrawn, MarkView } from '#shared/contracts/marks.ts';
import { Refusal } from '../../../http/api.ts';
import { LiveMarks, shownMarks, type MarkCalls } from './live-marks.ts';

const ana = { id: '01890000-0000-7000-8000-00000000000a', name: 'Ana Lyst' };
const other = { id: '01890000-0000-7000-8000-00000000000b', name: 'Second Reader' };
const fractographId = FractographId.parse('01890000-0000-7000-8000-00000000000f');
const drawn: MarkDrawn = {
  kind: 'origin',
  geometry: { shape: 'point', at: { x: 5, y: 5 } },
  certainty: 'certain',
  boundary: null,
  originCode: '?',
  note: '',
};

async function settled(live: LiveMarks): Promise<void> {
  while (live.state().waiting.length > 0) await new Promise((done) => setTimeout(done, 2));
}

/** A server of one bench: keeps marks, can be out of reach, and lets another change a mark. */
function aServer() {
  const kept = new Map<string, MarkView>();
  const server = { reachable: true, kept };
  const answer = (mark: MarkView) => {
    kept.set(mark.id, mark);
    return Promise.resolve(mark);
  };
  const seen = (id: string, versionSeen: number): MarkView => {
    const mark = kept.get(id);
    if (!mark) throw new Refusal({ code: 'not-found', message: 'Nothing here.' });
    if (mark.version !== versionSeen) throw new Refusal({ code: 'stale-version', message: 'Changed.', current: mark });
    return { ...mark, version: mark.version + 1, madeBy: ana };
  };
  const reached = async () => {
    await new Promise((done) => setTimeout(done, 1));
    if (!server.reachable) throw new Refusal({ code: 'not-now', message: 'No answer.' });
  };
  const calls: MarkCalls = {
    draw: async (mark) => {
      await reached();
      const id = mark.id ?? '';
      const places = { fractographId, versionId: id, version: 1, removed: false, madeBy: ana };
      return answer({ ...drawn, ...mark, ...places, id, number: kept.size + 1, madeAt: '2026-03-09T10:00:00.000Z' });
    },
    change: async (id, { versionSeen, ...change }) => {
      await reached();
      return answer({ ...seen(id, versionSeen), ...change });
    },
    remove: async (id, versionSeen) => answer({ ...seen(id, versionSeen), removed: true }),
    restore: async (id, versionSeen) => answer({ ...seen(id, versionSeen), removed: false }),
    keep: (mark) => void kept.set(mark.id, mark),
    refetch: () => Promise.resolve(),
  };
  const live = new LiveMarks(calls, ana);
  const shown = () => {
    const marks = shownMarks([...kept.values()], live.state().waiting, { me: ana, fractographId });
    live.see(marks);
    return marks;
  };
  return { server, live, shown };
}

const settle = () => new Promise((done) => setTimeout(done, 25));

describe('marks sent from the bench', () => {
  it('show at once and get their number when they are kept', async () => {
    const { live, shown } = aServer();
    live.draw(drawn);
    expect(shown()).toMatchObject([{ number: null, waiting: true }]);
    await settle();
    expect(shown()).toMatchObject([{ number: 1, waiting: false }]);
  });

  it('wait in their order while the server is out of reach, and are all kept after', async () => {
    const { server, live, shown } = aServer();
    server.reachable = false;
    const id = live.draw(drawn);
    shown();
    live.change(id, { note: 'first' });
    shown();
    live.change(id, { note: 'second' });
    await settle();
    expect(live.state()).toMatchObject({ outOfReach: true, waiting: { length: 3 } });
    expect(shown()).toMatchObject([{ note: 'second', version: 3 }]);
    server.reachable = true;
    live.tryNow();
    await settle();
    expect(shown()).toMatchObject([{ note: 'second', version: 3, waiting: false }]);
    live.close();
  });

  it('show both versions when another was faster, and let one’s own follow', async () => {
    const { server, live, shown } = aServer();
    const id = live.draw(drawn);
    await settle();
    const [mark] = shown();
    server.kept.set(id, { ...mark, number: 1, version: 2, madeBy: other, note: 'theirs' });
    live.change(id, { note: 'mine' });
    await settle();
    expect(live.state().conflict).toMatchObject({ mine: { note: 'mine' }, theirs: { note: 'theirs' } });
    shown();
    live.settle('mine');
    await settle();
    expect(shown()).toMatchObject([{ note: 'mine', version: 3, madeBy: ana }]);
  });

  it('are taken back by undo, but not where another has changed them since', async () => {
    const { server, live, shown } = aServer();
    const id = live.draw(drawn);
    await settle();
    shown();
    live.change(id, { certainty: 'possible' });
    await settle();
    shown();
    live.undo();
    await settle();
    expect(shown()).toMatchObject([{ certainty: 'certain', version: 3 }]);
    server.kept.set(id, { ...shown()[0], number: 1, version: 4, madeBy: other });
    shown();
    live.undo();
    await settle();
    expect(live.state().refused?.message).toContain('Second Reader');
    expect(shown()).toMatchObject([{ removed: false, version: 4 }]);
  });

  it('takes its own act back though the page has not read it again yet', async () => {
    const { server, live, shown } = aServer();
    const id = live.draw(drawn);
    shown();
    await settled(live);
    const before = shown();
    live.change(id, { geometry: { shape: 'point', at: { x: 9, y: 9 } } });
    await settled(live);
    // a list asked for before the change was kept arrives after it
    live.see(before);
    live.undo();
    await settled(live);
    expect(live.state().conflict).toBeNull();
    expect(server.kept.get(id)).toMatchObject({ version: 3, geometry: { at: { x: 5, y: 5 } } });
  });
});
