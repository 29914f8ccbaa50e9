import { useState, type FormEvent } from 'react';
import type { MarkGeometry } from '#shared/contracts/marks.ts';
import { Button } from '../../../ui/button.tsx';
import { fieldsOf, readTyped, withFields } from '../geometry-fields.ts';

type MarkNumbersProps = { name: string; geometry: MarkGeometry; onKeep: (geometry: MarkGeometry) => void };

/**
 * The coordinates or half-axes of a mark as fields, so that it can be moved without a pointer. What is being typed stays
 * when the mark moves meanwhile; the other fields follow it. Given a key by mark.
 */
export function MarkNumbers({ name, geometry, onKeep }: MarkNumbersProps) {
  const fields = fieldsOf(geometry);
  const [touched, setTouched] = useState<Readonly<Record<number, string>>>({});
  const typed = fields.map(({ value }, index) => touched[index] ?? shown(value));
  const [fault, setFault] = useState<string | null>(null);
  const keep = (event: FormEvent) => {
    event.preventDefault();
    const values = typed.map(readTyped);
    const wrong = values.findIndex((value) => value === null);
    if (wrong >= 0) return setFault(`${fields[wrong].word} is not a number. Type it as 123.4.`);
    setFault(null);
    setTouched({});
    // a number left as it was keeps all its digits
    onKeep(
      withFields(
        geometry,
        values.map((value, index) => untouched(fields[index].value, typed[index]) ?? value ?? 0),
      ),
    );
  };
  return (
    <form className="flex flex-wrap items-end gap-x-3 gap-y-2" onSubmit={keep}>
      {fields.map(({ word, unit }, index) => (
        <label key={word} className="flex flex-col text-s text-ink-2">
          {word}, {unit}
          <input
            type="text"
            inputMode="decimal"
            aria-label={`${name}, ${word}, ${unit}`}
            className="num h-7 w-[84px] rounded-[2px] border border-control bg-sheet px-2 text-ink coarse:h-[44px]"
            value={typed[index]}
            onChange={(event) => setTouched({ ...touched, [index]: event.target.value })}
          />
        </label>
      ))}
      <Button type="submit" small>
        Move {name} there
      </Button>
      {fault ? (
        <p role="alert" className="w-full text-s font-semibold text-iron">
          {fault}
        </p>
      ) : null}
    </form>
  );
}

const shown = (value: number): string => String(Math.round(value * 100) / 100);

function untouched(value: number, text: string): number | null {
  return shown(value) === text ? value : null;
}
