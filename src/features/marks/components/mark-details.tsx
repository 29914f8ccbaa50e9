import { useState } from 'react';
import { Button } from '../../../ui/button.tsx';
import type { MarkChange } from '../mark-change.ts';
import { markName, type ListedMark } from '../listed-mark.ts';
import { GeometryChoices, MarkChoices } from './mark-choices.tsx';
import { MarkNumbers } from './mark-numbers.tsx';

type MarkDetailsProps = {
  mark: ListedMark;
  /** Why the mark cannot be changed here; null where it can. */
  closedBecause: string | null;
  onChange: (change: MarkChange) => void;
  onRemove: () => void;
  onVersions: () => void;
};

/** What can be said of the selected mark, its numbers, and the ways to take it off or look at its earlier states. */
export function MarkDetails({ mark, closedBecause, onChange, onRemove, onVersions }: MarkDetailsProps) {
  const name = markName(mark);
  const closed = closedBecause !== null;
  return (
    <div className="flex flex-col gap-2 py-2 pr-2 pl-[12px]">
      <p className="flex flex-wrap items-baseline gap-x-4 gap-y-1">
        <MarkChoices kind={mark.kind} choices={mark} onChoose={onChange} disabled={closed} />
        <GeometryChoices
          geometry={mark.geometry}
          isLength={mark.kind === 'length'}
          onChoose={(geometry) => onChange({ geometry })}
          disabled={closed}
        />
        <NoteLine key={mark.note} mark={mark} closed={closed} onKeep={(note) => onChange({ note })} />
      </p>
      {closed ? (
        <p className="text-s text-ink-2">{closedBecause}</p>
      ) : (
        <MarkNumbers key={mark.id} name={name} geometry={mark.geometry} onKeep={(geometry) => onChange({ geometry })} />
      )}
      <p className="acts">
        {closed ? null : (
          <Button small kind="iron" onClick={onRemove}>
            Take {name} off
          </Button>
        )}
        {mark.number === null ? null : (
          <Button small kind="plain" onClick={onVersions}>
            Earlier versions of {name}
          </Button>
        )}
      </p>
    </div>
  );
}

function NoteLine({ mark, closed, onKeep }: { mark: ListedMark; closed: boolean; onKeep: (note: string) => void }) {
  const [text, setText] = useState(mark.note);
  const keep = () => {
    if (text !== mark.note) onKeep(text);
  };
  return (
    <label className="flex min-w-[180px] flex-1 items-baseline gap-2 text-s">
      <span className="text-ink-2">Note</span>
      <input
        type="text"
        maxLength={2000}
        aria-label={`Note of ${markName(mark)}`}
        className="min-w-0 flex-1 border-b border-control bg-transparent py-[2px]"
        value={text}
        disabled={closed}
        onChange={(event) => setText(event.target.value)}
        onBlur={keep}
        onKeyDown={(event) => {
          if (event.key === 'Enter') keep();
        }}
      />
    </label>
  );
}
