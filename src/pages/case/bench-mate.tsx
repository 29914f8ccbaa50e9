import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { FractographView, ScaleView } from '#shared/contracts/fractographs.ts';
import type { Bench } from '#src/features/fractographs/bench/bench-store.ts';
import { Face } from '#src/features/fractographs/bench/parts/face.tsx';
import { useBench, useTogether } from '#src/features/fractographs/bench/use-bench.ts';
import { marksOf } from '#src/features/marks/api.ts';

type BenchMateProps = {
  number: string;
  mate: FractographView;
  first: Bench;
  firstScale: ScaleView | null;
  together: boolean;
};

const askNothing = () => undefined;

/** The mating face, turned over so that features answer each other across the fold. It is looked at here, marked on its own. */
export function BenchMate({ number, mate, first, firstScale, together }: BenchMateProps) {
  const { data: kept } = useQuery(marksOf(number, mate.id));
  const marks = useMemo(() => (kept ?? []).map((mark) => ({ ...mark, waiting: false })), [kept]);
  const image = { widthPx: mate.widthPx ?? 1, heightPx: mate.heightPx ?? 1 };
  const bench = useBench(image, marks, { turnedOver: true, fixed: true, onAsk: askNothing });
  useTogether({ bench: first, scale: firstScale }, { bench, scale: mate.scale }, together);
  return (
    <Face
      bench={bench}
      marks={marks}
      scale={mate.scale}
      tiles={`/api/cases/${number}/fractographs/${mate.id}/tiles`}
      name={`Mating face, Fig. ${mate.figureNumber}`}
      tag={`mating face ${mate.fragment?.code ?? `Fig. ${mate.figureNumber}`}, turned over`}
      tagSide="right"
    />
  );
}
