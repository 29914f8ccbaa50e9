import { useSyncExternalStore } from 'react';
import type { ScaleView } from '#shared/contracts/fractographs.ts';
import type { Bench } from '#src/features/fractographs/bench/bench-store.ts';
import { BenchCheck, LightPanel } from '#src/features/fractographs/bench/parts/light-panel.tsx';
import { ScalePanel } from '#src/features/fractographs/bench/parts/scale-panel.tsx';

type MateShown = {
  shown: boolean;
  together: boolean;
  onShow: (shown: boolean) => void;
  onTogether: (together: boolean) => void;
};

type BenchLightProps = {
  bench: Bench;
  /** How the mating face stands; null where there is none. */
  mate: MateShown | null;
  scale: ScaleView | null;
  closedBecause: string | null;
  /** Opens the form of the scale; null while it is open. */
  onScale: (() => void) | null;
};

/** Light, the mating face, and the scale with where it is from. */
export function BenchLight({ bench, mate, scale, closedBecause, onScale }: BenchLightProps) {
  const { light } = useSyncExternalStore(bench.subscribe, bench.state);
  return (
    <section className="bench-panel is-light" aria-label="Light and scale">
      <LightPanel light={light} onLight={(change) => bench.do({ kind: 'lit', light: change })}>
        <BenchCheck
          word="Mating face"
          letter="B"
          checked={mate?.shown ?? false}
          disabled={mate === null}
          onCheck={(shown) => mate?.onShow(shown)}
        />
        <BenchCheck
          word="Together"
          letter="T"
          checked={mate?.together ?? false}
          disabled={mate === null}
          onCheck={(together) => mate?.onTogether(together)}
        />
      </LightPanel>
      <ScalePanel scale={scale} closedBecause={closedBecause} onOpen={onScale} />
    </section>
  );
}
