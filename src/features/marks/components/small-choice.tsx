import type { ReactNode } from 'react';

type SmallChoiceProps<Value extends string> = {
  /** Names the choice for a screen reader. */
  name: string;
  value: Value;
  options: readonly (readonly [value: Value, words: string])[];
  onChoose: (value: Value) => void;
  disabled?: boolean;
  before?: ReactNode;
};

/** One of a short list, within a line of words. */
export function SmallChoice<Value extends string>(props: SmallChoiceProps<Value>) {
  const { name, value, options, onChoose, disabled, before } = props;
  return (
    <label className="inline-flex items-baseline gap-1 text-s">
      {before}
      <select
        aria-label={name}
        className="max-w-[150px] border-b border-dotted border-cobalt bg-transparent py-[2px] text-cobalt disabled:border-transparent disabled:text-ink-2 coarse:min-h-[44px] [&>option]:bg-sheet [&>option]:text-ink"
        value={value}
        disabled={disabled}
        onChange={(event) => {
          const chosen = options.find(([each]) => each === event.target.value);
          if (chosen) onChoose(chosen[0]);
        }}
      >
        {options.map(([each, words]) => (
          <option key={each} value={each}>
            {words}
          </option>
        ))}
      </select>
    </label>
  );
}
