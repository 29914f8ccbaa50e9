import { useState, type FormEvent } from 'react';
import type { BarReading, ScaleBinding } from '#shared/contracts/fractographs.ts';
import { distancePx } from '#shared/numeric/imaging/distance.ts';
import { parseQuantity } from '#shared/numeric/units/parse-quantity.ts';
import { formatNumber } from '#shared/wording/quantity.ts';
import { Button } from '../../../../ui/button.tsx';

const enoughReadings = 2;
// A printed bar is taken to be right within half a per cent unless its maker says otherwise.
const barRelativeUncertainty = 0.005;
const umPerMm = 1000;

type BarFormProps = {
  readings: readonly BarReading[];
  onBind: (reading: ScaleBinding['reading']) => void;
  onLeave: () => void;
  /** The server's answer to the last try, in words. */
  fault: string | null;
  busy: boolean;
};

/** The bar on the image, drawn along twice, and what it stands for. */
export function BarForm({ readings, onBind, onLeave, fault, busy }: BarFormProps) {
  const [typed, setTyped] = useState('');
  const [wrong, setWrong] = useState<string | null>(null);
  const missing = Math.max(0, enoughReadings - readings.length);
  const bind = (event: FormEvent) => {
    event.preventDefault();
    const length = parseQuantity(typed, { kind: 'length', openUnit: true });
    if (length.kind === 'refused') return setWrong(length.reason);
    setWrong(null);
    const barLengthUm = length.value * umPerMm;
    const barStandardUncertaintyUm = barLengthUm * barRelativeUncertainty;
    onBind({ way: 'burned bar', readings: [...readings], barLengthUm, barStandardUncertaintyUm, typed: typed.trim() });
  };
  return (
    <form onSubmit={bind} className="mt-1 flex flex-col gap-1">
      <p role="status">
        {readings.length === 0
          ? 'Set both ends of the bar on the image, then once more.'
          : readings.map(({ from, to }) => `${formatNumber(distancePx(from, to), { decimals: 1 })}\u00a0px`).join(', ')}
        {missing > 0 ? ` ${missing} to read.` : ''}
      </p>
      <label className="flex items-baseline gap-2">
        The bar says
        <input
          type="text"
          className="num h-7 w-[110px] rounded-[2px] border border-control bg-sheet px-2 coarse:h-[44px]"
          placeholder="with its unit"
          value={typed}
          onChange={(event) => setTyped(event.target.value)}
        />
      </label>
      {(wrong ?? fault) ? (
        <p role="alert" className="text-s font-semibold text-iron">
          {wrong ?? fault}
        </p>
      ) : null}
      <p className="acts">
        <Button small type="submit" disabled={missing > 0 || busy}>
          Bind the bar’s scale
        </Button>
        <Button small kind="plain" onClick={onLeave}>
          Leave the bar
        </Button>
      </p>
    </form>
  );
}
