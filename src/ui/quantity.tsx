import { Fragment } from 'react';
import { joinClasses } from './join-classes.ts';

const noBreakSpace = '\u00a0';

/** A unit with its raised half: MPa m½ reads with ½ above the line. Spaces inside it do not break. */
export function UnitWord({ unit }: { unit: string }) {
  const parts = unit.replaceAll(' ', noBreakSpace).split('½');
  return parts.map((part, index) => (
    <Fragment key={index}>
      {part}
      {index < parts.length - 1 ? <sup>½</sup> : null}
    </Fragment>
  ));
}

type QuantityProps = {
  /** The value as text, already rounded. */
  value: string;
  /** ± U as text, in the value's unit and to its decimals. */
  plusMinus?: string | null;
  unit?: string | null;
  /** Set where the value is the point of the line. */
  strong?: boolean;
  /** Rests on an input that has changed since: keeps its ink and gets a dashed underline. */
  stale?: boolean;
};

/** A value with ± and unit: value in ink, the rest secondary, never broken over lines. */
export function Quantity({ value, plusMinus, unit, strong, stale }: QuantityProps) {
  const hasUnit = unit !== null && unit !== undefined && unit !== '';
  return (
    <span className={joinClasses('quantity', strong && 'font-semibold', stale && 'is-stale-value')}>
      {value}
      {plusMinus || hasUnit ? (
        <span>
          {plusMinus ? `${noBreakSpace}±${noBreakSpace}${plusMinus}` : null}
          {hasUnit ? noBreakSpace : null}
          {hasUnit ? <UnitWord unit={unit} /> : null}
        </span>
      ) : null}
    </span>
  );
}
