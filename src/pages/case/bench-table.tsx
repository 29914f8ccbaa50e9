import { useCallback, useEffect, useMemo, useRef, useState, useSyncExternalStore } from 'react';
import { useQuery } from '@tanstack/react-query';
import { useNavigate, useSearchParams } from 'react-router-dom';
import type { BarReading, FractographView } from '#shared/contracts/fractographs.ts';
import type { MarkVersionView, MarkView } from '#shared/contracts/marks.ts';
import type { Person } from '#shared/contracts/people.ts';
import type { Answer, CaseAct } from '#shared/rules/may.ts';
import { useLiveCase } from '#src/collaboration/live-case.ts';
import { originOf, type ShownMark } from '#src/features/fractographs/bench/bench-state.ts';
import type { Ask } from '#src/features/fractographs/bench/moves.ts';
import { BenchHead } from '#src/features/fractographs/bench/parts/bench-head.tsx';
import { Face } from '#src/features/fractographs/bench/parts/face.tsx';
import { useBench } from '#src/features/fractographs/bench/use-bench.ts';
import { useLiveMarks } from '#src/features/fractographs/bench/use-live-marks.ts';
import { markCalls } from '#src/features/marks/api.ts';
import { sessionQuery } from '#src/http/session.ts';
import { BenchLight } from './bench-light.tsx';
import { BenchMarks } from './bench-marks.tsx';
import { BenchMate } from './bench-mate.tsx';
import { BenchNotices, KeptLine } from './bench-notices.tsx';
import { BenchScale } from './bench-scale.tsx';
import { BenchTools } from './bench-tools.tsx';
import { useBenchKeys } from './use-bench-keys.ts';

type BenchTableProps = {
  number: string;
  figures: readonly FractographView[];
  current: FractographView;
  /** The image of the mating face, where it has been brought in. */
  mate: FractographView | null;
  kept: readonly MarkView[];
  person: Person;
  acts: Readonly<Record<CaseAct, Answer>>;
};

type Viewed = { markId: string; version: MarkVersionView };

/** The bench with everything on it: faces, tools, the list of marks, light and scale. */
export function BenchTable({ number, figures, current, mate, kept, person, acts }: BenchTableProps) {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const face = useRef<HTMLDivElement>(null);
  const calls = useMemo(() => markCalls(number, current.id), [number, current.id]);
  const { live, state: sending, marks } = useLiveMarks(kept, calls, { me: person, fractographId: current.id });
  const here = useLiveCase(number, `fractographs/${current.id}`);
  const [readings, setReadings] = useState<readonly BarReading[]>([]);
  const [scaleOpen, setScaleOpen] = useState(search.has('scale') && acts.calibrate.allowed);
  const [viewed, setViewed] = useState<Viewed | null>(null);
  const [mateShown, setMateShown] = useState(() => mate !== null && !window.matchMedia('(max-width: 640px)').matches);
  const [together, setTogether] = useState(true);
  const { data: session } = useQuery(sessionQuery);

  const answer = useCallback(
    (ask: Ask) => {
      if (ask.kind === 'draw') live.draw(ask.mark);
      if (ask.kind === 'move') live.change(ask.markId, { geometry: ask.geometry });
      if (ask.kind === 'bar read') setReadings((read) => [...read, { from: ask.from, to: ask.to }]);
    },
    [live],
  );
  const drawn = useMemo(() => withViewed(marks, viewed), [marks, viewed]);
  const canMark = acts.mark.allowed;
  const bench = useBench(sizeOf(current), drawn, { fixed: !canMark, onAsk: answer });
  const selectedId = useSyncExternalStore(bench.subscribe, () => bench.state().selectedId);
  const toFace = () => face.current?.focus({ preventScroll: true });
  useEffect(() => face.current?.focus({ preventScroll: true }), []);

  const turn = (by: number) => {
    const next = figures[figures.findIndex(({ id }) => id === current.id) + by];
    if (next) void navigate(`/cases/${number}/fractographs/${next.id}`);
  };
  const onKeyDown = useBenchKeys({
    bench,
    letterKeys: session?.settings?.letterKeys ?? true,
    closed: !canMark,
    toFace,
    onOther: (key) => {
      if (key.kind === 'turn') turn(key.by);
      if (key.kind === 'mating face') setMateShown(mate !== null && !mateShown);
      if (key.kind === 'together') setTogether(!together);
      if (key.kind === 'undo') live.undo();
      if (key.kind === 'remove selected' && selectedId) live.remove(selectedId);
    },
  });
  const from = { scale: current.scale, origin: originOf(marks) };
  const closedBecause = acts.mark.allowed ? null : acts.mark.reason;
  return (
    <div data-own-keys onKeyDown={onKeyDown} className="min-h-screen bg-ground">
      <BenchHead
        number={number}
        figures={figures}
        current={current}
        others={here.people.filter(({ id }) => id !== person.id)}
        personName={person.name}
        kept={<KeptLine sending={sending} live={live} />}
      />
      <main id="content">
        <BenchNotices
          sending={sending}
          live={live}
          from={from}
          viewed={viewed && { name: nameOfMark(marks, viewed.markId), version: viewed.version }}
          onViewNow={() => setViewed(null)}
        />
        <div className={`bench-faces ${mate && mateShown ? 'has-mate' : ''}`}>
          <Face
            bench={bench}
            marks={drawn}
            scale={current.scale}
            tiles={`/api/cases/${number}/fractographs/${current.id}/tiles`}
            name={`Fig. ${current.figureNumber}`}
            tag={current.fragment?.code ?? `Fig. ${current.figureNumber}`}
            tagSide="left"
            focusRef={face}
          />
          {mate && mateShown ? (
            <BenchMate number={number} mate={mate} first={bench} firstScale={current.scale} together={together} />
          ) : null}
        </div>
        <div className="bench-panels">
          <BenchTools bench={bench} closedBecause={closedBecause} toFace={toFace} />
          {scaleOpen ? (
            <BenchScale
              number={number}
              image={current}
              bench={bench}
              readings={readings}
              onReadings={setReadings}
              onDraw={toFace}
              onDone={() => setScaleOpen(false)}
            />
          ) : (
            <BenchMarks
              number={number}
              marks={marks}
              from={from}
              bench={bench}
              live={live}
              closedBecause={closedBecause}
              onView={(markId, version) => setViewed({ markId, version })}
            />
          )}
          <BenchLight
            bench={bench}
            mate={mate === null ? null : { shown: mateShown, together, onShow: setMateShown, onTogether: setTogether }}
            scale={current.scale}
            closedBecause={acts.calibrate.allowed ? null : acts.calibrate.reason}
            onScale={scaleOpen ? null : () => setScaleOpen(true)}
          />
        </div>
      </main>
    </div>
  );
}

/** Only images that are ready, and so have a size, come to the bench. */
function sizeOf({ widthPx, heightPx }: FractographView) {
  if (widthPx === null || heightPx === null) throw new Error('an image without a size was laid on the bench');
  return { widthPx, heightPx };
}

function withViewed(marks: readonly ShownMark[], viewed: Viewed | null): readonly ShownMark[] {
  if (!viewed) return marks;
  return marks.map((mark) => (mark.id === viewed.markId ? { ...mark, ...viewed.version } : mark));
}

function nameOfMark(marks: readonly ShownMark[], markId: string): string {
  return `m${marks.find(({ id }) => id === markId)?.number ?? ''}`;
}
