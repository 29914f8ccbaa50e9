import { useState } from 'react';
import type { BarReading, FractographView, ScaleBinding } from '#shared/contracts/fractographs.ts';
import { useBindScale } from '#src/features/fractographs/api.ts';
import { BarForm } from '#src/features/fractographs/bench/parts/bar-form.tsx';
import { ScalePanel } from '#src/features/fractographs/bench/parts/scale-panel.tsx';

type BenchScaleProps = {
  number: string;
  image: FractographView;
  /** Readings along the bar drawn so far. */
  readings: readonly BarReading[];
  closedBecause: string | null;
  onReadBar: () => void;
  onDone: () => void;
};

/** The image's scale, and the bar read on the image itself. */
export function BenchScale({ number, image, readings, closedBecause, onReadBar, onDone }: BenchScaleProps) {
  const [open, setOpen] = useState(false);
  const bind = useBindScale(number, image.id);
  const leave = () => {
    setOpen(false);
    bind.reset();
    onDone();
  };
  const send = (reading: ScaleBinding['reading']) =>
    bind.mutate(
      { reading, bindingSeen: image.scale?.bindingId ?? null, confirmed: bind.isError, reason: '' },
      { onSuccess: leave },
    );
  return (
    <ScalePanel
      scale={image.scale}
      closedBecause={closedBecause}
      onOpen={() => {
        setOpen(true);
        onReadBar();
      }}
    >
      {open ? (
        <BarForm
          readings={readings}
          onBind={send}
          onLeave={leave}
          fault={bind.error?.message ?? null}
          busy={bind.isPending}
        />
      ) : null}
    </ScalePanel>
  );
}
