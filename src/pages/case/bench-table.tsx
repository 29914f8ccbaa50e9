import { useCallback, useEffect, useMemo, useRef, useState, useSyncExternalStore, type KeyboardEvent } from 'react';
import { useQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import type { BarReading, FractographView } from '#shared/contracts/fractographs.ts';
import type { MarkVersionView, MarkView } from '#shared/contracts/marks.ts';
import type { Person } from '#shared/contracts/people.ts';
import type { Answer, CaseAct } from '#shared/rules/may.ts';
import { useLiveCase } from '#src/collaboration/live-case.ts';
import { originOf } from '#src/features/fractographs/bench/bench-state.ts';
import { readBenchKey } from '#src/features/fractographs/bench/keys.ts';
import type { Ask } from '#src/features/fractographs/bench/moves.ts';
import { BenchHead } from '#src/features/fractographs/bench/parts/bench-head.tsx';
import { Face } from '#src/features/fractographs/bench/parts/face.tsx';
import { BenchCheck, LightPanel } from '#src/features/fractographs/bench/parts/light-panel.tsx';
import { ToolTray } from '#src/features/fractographs/bench/parts/tool-tray.tsx';
import { useBench } from '#src/features/fractographs/bench/use-bench.ts';
import { useLiveMarks } from '#src/features/fractographs/bench/use-live-marks.ts';
import { markCalls } from '#src/features/marks/api.ts';
import { MarkChoices } from '#src/features/marks/components/mark-choices.tsx';
import { sessionQuery } from '#src/http/session.ts';
import { isField } from './bench-keys.ts';
import { BenchMarks } from './bench-marks.tsx';
import { BenchMate } from './bench-mate.tsx';
import { BenchNotices, KeptLine } from './bench-notices.tsx';
import { BenchScale } from './bench-scale.tsx';

export type BenchTableProps = {
  number: string;
  figures: readonly FractographView[];
  current: FractographView;
  mate: FractographView | null;
  kept: readonly MarkView[];
  person: Person;
  acts: Readonly<Record<CaseAct, Answer>>;
};

/** The bench with everything on it: faces, tools, the list of marks, light and scale. */
export function BenchTable({ number, figures, current, mate, kept, person, acts }: BenchTableProps) {
  const navigate = useNavigate();
  const focus = useRef<HTMLDivElement>(null);
  const calls = useMemo(() => markCalls(number, current.id), [number, current.id]);
  const { live, state: sending, marks } = useLiveMarks(kept, calls, { me: person, fractographId: current.id });
  const here = useLiveCase(number, `fractographs/${current.id}`);
  const [readings, setReadings] = useState<readonly BarReading[]>([]);
  const [viewed, setViewed] = useState<{ markId: string; version: MarkVersionView } | null>(null);
  const [mateShown, setMateShown] = useState(mate !== null);
  const [together, setTogether] = useState(true);
  const { data: session } = useQuery(sessionQuery);

  const answerAsk = useCallback(
    (ask: Ask) => {
      if (ask.kind === 'draw') live.draw(ask.mark);
      if (ask.kind === 'move') live.change(ask.markId, { geometry: ask.geometry });
      if (ask.kind === 'bar read') setReadings((read) => [...read, { from: ask.from, to: ask.to }]);
    },
    [live],
  );
  const image = { widthPx: current.widthPx ?? 1, heightPx: current.heightPx ?? 1 };
  const drawn = useMemo(
    () => (viewed ? marks.map((mark) => (mark.id === viewed.markId ? { ...mark, ...viewed.version } : mark)) : marks),
    [marks, viewed],
  );
  const bench = useBench(image, drawn, { onAsk: answerAsk });
  const state = useSyncExternalStore(bench.subscribe, bench.state);
  const closedBecause = acts.mark.allowed ? null : acts.mark.reason;
  useEffect(() => focus.current?.focus({ preventScroll: true }), []);

  const turn = (by: 1 | -1) => {
    const next = figures[figures.findIndex(({ id }) => id === current.id) + by];
    if (next) void navigate(`/cases/${number}/fractographs/${next.id}`);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    const onFace = event.target instanceof HTMLElement && event.target.matches('[data-face]');
    if (isField(event.target) || (!onFace && !/^.$/.test(event.key) && event.key !== 'Escape')) return;
    const key = readBenchKey(event, state, session?.settings?.letterKeys ?? true);
    if (!key) return;
    event.preventDefault();
    if (key.kind === 'turn') return turn(key.by);
    if (key.kind === 'mating face') return setMateShown(mate !== null && !mateShown);
    if (key.kind === 'together') return setTogether(!together);
    if (key.kind === 'undo') return live.undo();
    if (key.kind === 'remove selected')
      return closedBecause || !state.selectedId ? undefined : live.remove(state.selectedId);
    if (key.kind === 'tool picked') {
      if (closedBecause) return;
      focus.current?.focus({ preventScroll: true });
    }
    bench.do(key);
  };
  const { tool } = state;
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
          from={{ scale: current.scale, origin: originOf(marks) }}
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
            focusRef={focus}
          />
          {mate && mateShown ? (
            <BenchMate number={number} mate={mate} first={bench} firstScale={current.scale} together={together} />
          ) : null}
        </div>
        <div className="bench-panels">
          <ToolTray
            tool={tool}
            closedBecause={closedBecause}
            onPick={(kind) => {
              bench.do({ kind: 'tool picked', tool: kind });
              focus.current?.focus({ preventScroll: true });
            }}
            choices={
              tool && tool !== 'scale bar' ? (
                <MarkChoices
                  kind={tool}
                  choices={state.as}
                  onChoose={(as) => bench.do({ kind: 'chosen', as: whole(as) })}
                />
              ) : null
            }
          />
          <BenchMarks
            number={number}
            marks={marks}
            from={{ scale: current.scale, origin: originOf(marks) }}
            bench={bench}
            live={live}
            closedBecause={closedBecause}
            onView={(markId, version) => setViewed({ markId, version })}
          />
          <section className="bench-panel is-light" aria-label="Light and scale">
            <LightPanel light={state.light} onLight={(light) => bench.do({ kind: 'lit', light })}>
              <BenchCheck
                word="Mating face"
                letter="B"
                checked={mate !== null && mateShown}
                disabled={mate === null}
                onCheck={setMateShown}
              />
              <BenchCheck
                word="Together"
                letter="T"
                checked={together && mate !== null}
                disabled={mate === null}
                onCheck={setTogether}
              />
            </LightPanel>
            <BenchScale
              number={number}
              image={current}
              readings={readings}
              closedBecause={acts.calibrate.allowed ? null : acts.calibrate.reason}
              onReadBar={() => {
                setReadings([]);
                bench.do({ kind: 'tool picked', tool: 'scale bar' });
                focus.current?.focus({ preventScroll: true });
              }}
              onDone={() => {
                setReadings([]);
                if (bench.state().tool === 'scale bar') bench.do({ kind: 'left' }, { kind: 'left' });
              }}
            />
          </section>
        </div>
      </main>
    </div>
  );
}

function nameOfMark(marks: readonly { id: string; number: number | null }[], markId: string): string {
  return `m${marks.find(({ id }) => id === markId)?.number ?? ''}`;
}

/** A choice left open is not taken over. */
function whole(as: {
  certainty?: MarkView['certainty'];
  boundary?: MarkView['boundary'];
  originCode?: MarkView['originCode'];
}) {
  const { certainty, boundary, originCode } = as;
  return {
    ...(certainty ? { certainty } : {}),
    ...(boundary ? { boundary } : {}),
    ...(originCode ? { originCode } : {}),
  };
}
