import type { BarReading, FractographView } from '#shared/contracts/fractographs.ts';
import type { Bench } from '#src/features/fractographs/bench/bench-store.ts';
import { ScaleForm } from '#src/features/fractographs/components/scale-form.tsx';

type BenchScaleProps = {
  number: string;
  image: FractographView;
  bench: Bench;
  /** Readings along the bar drawn so far. */
  readings: readonly BarReading[];
  onReadings: (readings: readonly BarReading[]) => void;
  /** Puts the focus on the face, where the bar is drawn. */
  onDraw: () => void;
  onDone: () => void;
};

/** The form of the scale, in the place of the list of marks, with the bar read on the image above it. */
export function BenchScale({ number, image, bench, readings, onReadings, onDraw, onDone }: BenchScaleProps) {
  const leave = () => {
    onReadings([]);
    if (bench.state().tool === 'scale bar') bench.do({ kind: 'left' }, { kind: 'left' });
    onDone();
  };
  return (
    <section className="bench-panel is-scale" aria-label="Scale of the image">
      <ScaleForm
        number={number}
        image={image}
        barReadings={readings}
        onDrawBar={() => {
          bench.do({ kind: 'tool picked', tool: 'scale bar' });
          onDraw();
        }}
        onClearBar={() => onReadings([])}
        onDone={leave}
      />
    </section>
  );
}
