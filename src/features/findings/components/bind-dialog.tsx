import { useQuery } from '@tanstack/react-query';
import type { Editor } from '@tiptap/react';
import { useState, type KeyboardEvent } from 'react';
import type { BindableValue, ValueFormat } from '#shared/contracts/findings.ts';
import { boundParts, boundText } from '#shared/wording/bound-value.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { joinClasses } from '#src/ui/join-classes.ts';
import { Kbd } from '#src/ui/kbd.tsx';
import { Quantity } from '#src/ui/quantity.tsx';
import { SearchLine } from '#src/ui/search-line.tsx';
import { bindableOf, useFindingsActs } from '../api.ts';
import { outlineOf, partAt } from '../editor/outline.ts';

type BindDialogProps = { number: string; editor: Editor; onClose: () => void };

const formats: readonly { words: string; format: ValueFormat }[] = [
  { words: 'two figures of its interval', format: { interval: true, decimals: null, significant: null } },
  { words: 'whole units', format: { interval: true, decimals: 0, significant: null } },
  { words: 'one decimal', format: { interval: true, decimals: 1, significant: null } },
];
const groups = ['Estimates', 'Lengths', 'Constants'] as const;
const optionId = (index: number) => `bindable-${index}`;

/** Chooses a value of the case for the place where the caret is; what it will read is shown before it is bound. */
export function BindDialog({ number, editor, onClose }: BindDialogProps) {
  const { data = [], isPending } = useQuery(bindableOf(number));
  const { bind } = useFindingsActs(number);
  const [words, setWords] = useState('');
  const [chosen, setChosen] = useState(0);
  const [style, setStyle] = useState(0);
  const [place] = useState(() => placeOf(editor));
  const shown = inGroups(data.filter((each) => matches(each, words)));
  const value = shown[Math.min(chosen, shown.length - 1)];
  const { format } = formats[style];
  const reads = value ? boundText(boundParts(value.value, format)) : '';
  const bindIt = () => {
    if (!value || value.standing === 'stale' || bind.isPending) return;
    bind.mutate(
      { ...value.bind, format },
      {
        onSuccess: (made) => {
          if (made) editor.chain().focus().insertBoundValue(made.id).run();
          onClose();
        },
      },
    );
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const step = { ArrowDown: 1, ArrowUp: -1 }[event.key];
    if (step !== undefined && shown.length > 0) {
      event.preventDefault();
      setChosen((Math.min(chosen, shown.length - 1) + step + shown.length) % shown.length);
    } else if (event.key === 'Enter') {
      event.preventDefault();
      bindIt();
    }
  };
  return (
    <Dialog
      open
      wide
      onOpenChange={(open) => (open ? undefined : onClose())}
      title="Bind a value"
      aside={place.words}
      acts={
        <>
          <Button kind="main" disabled={bind.isPending} closedBecause={closedBecause(value)} onClick={bindIt}>
            {value ? `Bind ${reads}` : 'Bind'}
          </Button>
          <Button onClick={onClose}>Leave without</Button>
          <span className="ml-auto text-s text-ink-2">
            <Kbd>↑</Kbd> <Kbd>↓</Kbd> choose, <Kbd>Enter</Kbd> binds, <Kbd>Esc</Kbd> leaves
          </span>
        </>
      }
    >
      <SearchLine
        label="Find a value"
        role="combobox"
        aria-expanded
        aria-controls="bindable-values"
        aria-activedescendant={value ? optionId(shown.indexOf(value)) : undefined}
        autoFocus
        value={words}
        onChange={(event) => {
          setWords(event.target.value);
          setChosen(0);
        }}
        onKeyDown={onKeyDown}
      />
      <div className="bind-choice">
        <Values
          values={shown}
          chosen={value}
          onChoose={(each) => setChosen(shown.indexOf(each))}
          isPending={isPending}
        />
        {value ? (
          <div className="bind-preview">
            <h4>How it will read</h4>
            <p className="font-serif text-prose">
              {place.before} <span className="bound-value">{reads}</span>
            </p>
            <h4>Written</h4>
            <label className="text-s text-ink-2">
              with its interval (<i>k</i> = 2), to{' '}
              <select className="bind-style" value={style} onChange={(event) => setStyle(Number(event.target.value))}>
                {formats.map((each, index) => (
                  <option key={each.words} value={index}>
                    {each.words}
                  </option>
                ))}
              </select>
            </label>
            <h4>Where it comes from</h4>
            <p className="text-s text-ink-2">{value.detail}</p>
          </div>
        ) : null}
      </div>
      {bind.error ? <FieldError id="bind-fault">{bind.error.message}</FieldError> : null}
    </Dialog>
  );
}

type ValuesProps = {
  values: readonly BindableValue[];
  chosen: BindableValue | undefined;
  onChoose: (value: BindableValue) => void;
  isPending: boolean;
};

function Values({ values, chosen, onChoose, isPending }: ValuesProps) {
  if (values.length === 0) {
    return <p className="py-3 text-ink-2">{isPending ? 'Reading values…' : 'No value of this case is called that.'}</p>;
  }
  return (
    <ul className="bind-values" role="listbox" id="bindable-values" aria-label="Values">
      {values.map((value, index) => (
        <li key={optionId(index)} role="presentation">
          {values[index - 1]?.group === value.group ? null : <p className="bind-group">{value.group}</p>}
          {/* Keys are heard by the search line, which names the chosen one. */}
          <div
            id={optionId(index)}
            role="option"
            aria-selected={value === chosen}
            className={joinClasses('bind-value', value === chosen && 'is-chosen')}
            onClick={() => onChoose(value)}
          >
            <span>
              {value.words}
              <small>{value.detail}</small>
            </span>
            <Quantity {...boundParts(value.value, formats[0].format)} />
            <b className="text-s text-iron">{value.standing}</b>
          </div>
        </li>
      ))}
    </ul>
  );
}

function closedBecause(value: BindableValue | undefined): string | undefined {
  if (!value) return 'Choose a value first.';
  return value.standing === 'stale' ? 'It is stale; settle it under Estimates first.' : undefined;
}

function matches({ words, detail, text }: BindableValue, wanted: string): boolean {
  const said = `${words} ${detail} ${text}`.toLowerCase();
  return wanted
    .toLowerCase()
    .split(/\s+/)
    .every((word) => said.includes(word));
}

const inGroups = (values: readonly BindableValue[]) =>
  groups.flatMap((group) => values.filter((value) => value.group === group));

/** Where the value goes: the part, and the words just before it. */
function placeOf(editor: Editor): { words: string; before: string } {
  const { doc, selection } = editor.state;
  const part = partAt(outlineOf(doc).parts, selection.from);
  const start = selection.$from.start();
  const before = doc.textBetween(start, selection.from, ' ', ' ').split(/\s+/).filter(Boolean).slice(-4).join(' ');
  const into = part === 0 ? 'into the text' : `into part ${part}`;
  return { words: before === '' ? into : `${into}, after “${before}”`, before };
}
