import type { ReactNode } from 'react';
import { Kbd } from '../../../../ui/kbd.tsx';
import type { Light } from '../bench-state.ts';

type LightPanelProps = { light: Light; onLight: (light: Partial<Light>) => void; children?: ReactNode };

/** Brightness, contrast and invert: they change how the image is shown, never the image. */
export function LightPanel({ light, onLight, children }: LightPanelProps) {
  return (
    <>
      <h2 className="bench-title">Light</h2>
      <Slider
        word="Brightness"
        keys={['[', ']']}
        range={{ min: -100, max: 100, step: 4 }}
        value={light.brightness}
        shown={light.brightness > 0 ? `+${light.brightness}` : `${light.brightness}`.replace('-', '−')}
        onValue={(brightness) => onLight({ brightness })}
      />
      <Slider
        word="Contrast"
        keys={['{', '}']}
        range={{ min: 0.2, max: 4, step: 0.1 }}
        value={light.contrast}
        shown={light.contrast.toFixed(1)}
        onValue={(contrast) => onLight({ contrast })}
      />
      <div className="mt-1 mb-[7px] flex flex-wrap justify-between gap-2 text-s">
        <BenchCheck word="Invert" letter="V" checked={light.inverted} onCheck={(inverted) => onLight({ inverted })} />
        {children}
      </div>
    </>
  );
}

type SliderProps = {
  word: string;
  keys: readonly [string, string];
  range: { min: number; max: number; step: number };
  value: number;
  shown: string;
  onValue: (value: number) => void;
};

function Slider({ word, keys, range, value, shown, onValue }: SliderProps) {
  return (
    <label className="grid min-h-[26px] grid-cols-[76px_1fr_34px_auto_auto] items-center gap-2 text-[14px]">
      {word}
      <input
        type="range"
        className="bench-slider"
        {...range}
        value={value}
        onChange={(event) => onValue(Number(event.target.value))}
      />
      <output className="text-right">{shown}</output>
      <Kbd>{keys[0]}</Kbd>
      <Kbd>{keys[1]}</Kbd>
    </label>
  );
}

type BenchCheckProps = {
  word: string;
  letter: string;
  checked: boolean;
  onCheck: (checked: boolean) => void;
  disabled?: boolean;
};

/** A box to tick, with its letter beside it. */
export function BenchCheck({ word, letter, checked, onCheck, disabled }: BenchCheckProps) {
  return (
    <label className="flex items-center gap-[5px] coarse:min-h-[44px]">
      <input
        type="checkbox"
        checked={checked}
        disabled={disabled}
        onChange={(event) => onCheck(event.target.checked)}
      />
      {word} <Kbd>{letter}</Kbd>
    </label>
  );
}
