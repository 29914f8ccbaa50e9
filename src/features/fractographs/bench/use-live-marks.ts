import { useEffect, useMemo, useState, useSyncExternalStore } from 'react';
import type { FractographId } from '#shared/contracts/ids.ts';
import type { Named } from '#shared/contracts/fractographs.ts';
import type { MarkView } from '#shared/contracts/marks.ts';
import { LiveMarks, shownMarks, type MarkCalls } from './live-marks.ts';

const undoShownMs = 10_000;

/** Marks as they show, with one's own waiting acts, and the acts themselves. Drawn anew for each fractograph. */
export function useLiveMarks(
  kept: readonly MarkView[],
  calls: MarkCalls,
  of: { me: Named; fractographId: FractographId },
) {
  const { me, fractographId } = of;
  const [live] = useState(() => new LiveMarks(calls, { id: me.id, name: me.name }));
  const state = useSyncExternalStore(live.subscribe, live.state);
  const marks = useMemo(
    () => shownMarks(kept, state.waiting, { me: { id: me.id, name: me.name }, fractographId }),
    [kept, state.waiting, me.id, me.name, fractographId],
  );
  useEffect(() => live.see(marks), [live, marks]);
  useEffect(() => {
    window.addEventListener('online', live.tryNow);
    return () => window.removeEventListener('online', live.tryNow);
  }, [live]);
  useEffect(() => {
    if (state.waiting.length === 0) return;
    const holdPage = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', holdPage);
    return () => window.removeEventListener('beforeunload', holdPage);
  }, [state.waiting.length]);
  useEffect(() => {
    if (!state.justRemoved) return;
    const timer = setInterval(() => {
      // stays for as long as the person is at it
      if (!document.activeElement?.closest('[data-undo]')) live.forgetRemoved();
    }, undoShownMs);
    return () => clearInterval(timer);
  }, [live, state.justRemoved]);
  return { live, state, marks };
}
