import { useState, useSyncExternalStore } from 'react';
import type { MarkVersionView } from '#shared/contracts/marks.ts';
import type { ShownMark } from '#src/features/fractographs/bench/bench-state.ts';
import type { Bench } from '#src/features/fractographs/bench/bench-store.ts';
import type { LiveMarks } from '#src/features/fractographs/bench/live-marks.ts';
import { MarksTable } from '#src/features/marks/components/marks-table.tsx';
import { MarkVersions } from '#src/features/marks/components/mark-versions.tsx';
import { markName, type ReadFrom } from '#src/features/marks/listed-mark.ts';
import { Button } from '#src/ui/button.tsx';

type BenchMarksProps = {
  number: string;
  marks: readonly ShownMark[];
  from: ReadFrom;
  bench: Bench;
  live: LiveMarks;
  closedBecause: string | null;
  onView: (markId: string, version: MarkVersionView) => void;
};

/** The list of marks beside the image, with those taken off below it. */
export function BenchMarks({ number, marks, from, bench, live, closedBecause, onView }: BenchMarksProps) {
  const state = useSyncExternalStore(bench.subscribe, bench.state);
  const [versionsOf, setVersionsOf] = useState<string | null>(null);
  const standing = marks.filter((mark) => !mark.removed);
  const removed = marks.filter((mark) => mark.removed && mark.number !== null);
  return (
    <section className="bench-panel" aria-label="Marks">
      <h2 className="bench-title">
        Marks on this face <small>{standing.length === 0 ? 'none yet' : `${standing.length} in all`}</small>
      </h2>
      <div className="bench-list">
        {standing.length === 0 ? (
          <p className="text-s text-ink-2">
            Begin with the origin: press O, aim with the pointer or the arrows, and set it with a click or Enter.
          </p>
        ) : (
          <MarksTable
            marks={marks}
            from={from}
            selectedId={state.selectedId}
            hiddenIds={state.hiddenIds}
            closedBecause={closedBecause}
            onSelect={(markId) => bench.do({ kind: 'selected', markId })}
            onChange={(markId, change) => live.change(markId, change)}
            onRemove={(markId) => live.remove(markId)}
            onShow={(markId, shown) => bench.do({ kind: 'shown', markId, shown })}
            onVersions={setVersionsOf}
          />
        )}
        {removed.length === 0 || closedBecause ? null : (
          <p className="mt-2 flex flex-wrap items-baseline gap-x-3 text-s text-ink-2">
            Taken off:
            {removed.map((mark) => (
              <Button key={mark.id} small kind="plain" onClick={() => live.restore(mark.id)}>
                Bring back {markName(mark)}
              </Button>
            ))}
          </p>
        )}
      </div>
      <MarkVersions
        number={number}
        mark={marks.find(({ id }) => id === versionsOf) ?? null}
        from={from}
        onClose={() => setVersionsOf(null)}
        onView={(version) => {
          if (versionsOf) onView(versionsOf, version);
          setVersionsOf(null);
        }}
      />
    </section>
  );
}
