import { useRef, useState, type KeyboardEvent, type ReactNode } from 'react';
import { markKinds, markKindTable, type MarkKind } from '#shared/vocabulary/mark-kinds.ts';
import { MarkGlyph } from '../../../../ui/glyphs/mark-glyph.tsx';
import { joinClasses } from '../../../../ui/join-classes.ts';
import { Kbd } from '../../../../ui/kbd.tsx';
import type { Tool } from '../bench-state.ts';

const columns = 2;
const steps: Readonly<Record<string, number>> = { ArrowRight: 1, ArrowLeft: -1, ArrowDown: columns, ArrowUp: -columns };

type ToolTrayProps = {
  tool: Tool;
  onPick: (kind: MarkKind) => void;
  /** How the next mark is taken: certainty and what the kind distinguishes. */
  choices: ReactNode;
  closedBecause: string | null;
};

/** The marks that can be drawn: a toolbar with one tab stop, arrows inside. */
export function ToolTray({ tool, onPick, choices, closedBecause }: ToolTrayProps) {
  const tray = useRef<HTMLDivElement>(null);
  const [current, setCurrent] = useState(0);
  const move = (event: KeyboardEvent) => {
    const by = steps[event.key];
    if (by === undefined) return;
    event.preventDefault();
    event.stopPropagation();
    const next = Math.min(Math.max(current + by, 0), markKinds.length - 1);
    setCurrent(next);
    tray.current?.querySelectorAll('button')[next]?.focus();
  };
  return (
    <section aria-label="Marks to draw" className="bench-panel" tabIndex={closedBecause ? 0 : undefined}>
      <h2 className="bench-title">
        Mark <small>{tool && tool !== 'scale bar' ? choices : 'letter picks, arrows aim, Enter sets'}</small>
      </h2>
      {closedBecause ? <p className="text-s text-ink-2">{closedBecause}</p> : null}
      <div
        ref={tray}
        role="toolbar"
        aria-label="Kinds of mark"
        aria-orientation="horizontal"
        className="grid grid-cols-[0.86fr_1fr] gap-x-2 gap-y-1"
        onKeyDown={move}
      >
        {markKinds.map((kind, index) => (
          <button
            key={kind}
            type="button"
            tabIndex={index === current ? 0 : -1}
            aria-pressed={tool === kind}
            aria-keyshortcuts={markKindTable[kind].key}
            disabled={closedBecause !== null}
            className={joinClasses('bench-tool', tool === kind && 'is-picked')}
            onFocus={() => setCurrent(index)}
            onClick={() => onPick(kind)}
          >
            <MarkGlyph shape={kind} />
            <span>{markKindTable[kind].word}</span>
            <Kbd>{markKindTable[kind].key.toUpperCase()}</Kbd>
          </button>
        ))}
      </div>
    </section>
  );
}
