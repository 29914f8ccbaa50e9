import { useSyncExternalStore } from 'react';
import type { MarkView } from '#shared/contracts/marks.ts';
import type { Bench } from '#src/features/fractographs/bench/bench-store.ts';
import type { DrawAs } from '#src/features/fractographs/bench/kinds/kind.ts';
import { ToolTray } from '#src/features/fractographs/bench/parts/tool-tray.tsx';
import { MarkChoices } from '#src/features/marks/components/mark-choices.tsx';

type BenchToolsProps = { bench: Bench; closedBecause: string | null; toFace: () => void };

/** The tray of marks, and how the next one is taken. */
export function BenchTools({ bench, closedBecause, toFace }: BenchToolsProps) {
  const { tool, as } = useSyncExternalStore(bench.subscribe, bench.state);
  return (
    <ToolTray
      tool={tool}
      closedBecause={closedBecause}
      onPick={(kind) => {
        bench.do({ kind: 'tool picked', tool: kind });
        toFace();
      }}
      choices={
        tool && tool !== 'scale bar' ? (
          <MarkChoices
            kind={tool}
            choices={as}
            onChoose={(change) => bench.do({ kind: 'chosen', as: chosen(change) })}
          />
        ) : null
      }
    />
  );
}

/** Of a choice what was made; what a kind does not carry stays as it was for the others. */
function chosen({ certainty, boundary, originCode }: Partial<MarkView>): Partial<DrawAs> {
  return {
    ...(certainty ? { certainty } : {}),
    ...(boundary ? { boundary } : {}),
    ...(originCode ? { originCode } : {}),
  };
}
