import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { BackgroundView } from '#shared/contracts/cases.ts';
import type { Answer } from '#shared/rules/may.ts';
import { standings } from '#shared/vocabulary/case-states.ts';
import { formatShortDay } from '#shared/wording/dates.ts';
import { Button } from '#src/ui/button.tsx';
import { Choice } from '#src/ui/choice.tsx';
import { GlyphWord } from '#src/ui/glyph-word.tsx';
import { StandingGlyph } from '#src/ui/glyphs/standing-glyph.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { backgroundOf } from '../api.ts';
import { BackgroundForm } from './background-form.tsx';

type BackgroundProps = { number: string; mayEdit: Answer; year: number };

const every = 'known, told or assumed';

/** What is known, told and assumed, each with its source and day; told is never printed as fact. */
export function Background({ number, mayEdit, year }: BackgroundProps) {
  const { data: statements, isPending } = useQuery(backgroundOf(number));
  const [standing, setStanding] = useState<string>(every);
  const [source, setSource] = useState('any source');
  const [writing, setWriting] = useState<BackgroundView | 'new' | null>(null);
  if (isPending || !statements) return <LoadingState words="Reading the background…" />;
  const sources = [...new Set(statements.map((statement) => statement.source))];
  const shown = statements.filter(
    (statement) =>
      (standing === every || statement.standing === standing) &&
      (source === 'any source' || statement.source === source),
  );
  const asOptions = (values: readonly string[]) => values.map((value) => ({ value, words: value }));
  return (
    <section>
      <RuleHead>Background</RuleHead>
      <p className="filter-sentence mb-2 !text-m">
        Show what is{' '}
        <Choice label="Standing" value={standing} options={asOptions([every, ...standings])} onChosen={setStanding} />,
        from{' '}
        <Choice label="Source" value={source} options={asOptions(['any source', ...sources])} onChosen={setSource} />.
        Told is not printed as fact.
      </p>
      {shown.length > 0 ? (
        <Table caption="Background" stacked>
          <thead>
            <tr>
              <Th>Standing</Th>
              <Th>Statement</Th>
              <Th>Source</Th>
              <Th numeric>Given</Th>
              <Th hidden>Change</Th>
            </tr>
          </thead>
          <tbody>
            {shown.map((statement) => (
              <tr key={statement.id}>
                <td className="w-24">
                  <GlyphWord glyph={<StandingGlyph standing={statement.standing} />}>{statement.standing}</GlyphWord>
                </td>
                <td className="is-wide py-1 leading-[1.35]">{statement.statement}</td>
                <td className="is-wide w-[206px] text-s text-ink-2">{statement.source}</td>
                <td className="num whitespace-nowrap text-ink-2" data-word="given">
                  {formatShortDay(statement.givenOn, year)}
                </td>
                <td className="num">
                  {mayEdit.allowed ? (
                    <Button
                      small
                      kind="plain"
                      aria-label={`Change “${statement.statement}”`}
                      onClick={() => setWriting(statement)}
                    >
                      Change
                    </Button>
                  ) : null}
                </td>
              </tr>
            ))}
          </tbody>
        </Table>
      ) : (
        <p className="py-2 text-ink-2">
          {statements.length === 0
            ? 'Nothing is written down yet: say what is known, told and assumed.'
            : 'None of these.'}
        </p>
      )}
      {writing ? (
        <BackgroundForm
          key={writing === 'new' ? 'new' : writing.id}
          number={number}
          statement={writing === 'new' ? null : writing}
          onLeave={() => setWriting(null)}
        />
      ) : (
        <div className="acts mt-2">
          <Button small closedBecause={mayEdit.allowed ? null : mayEdit.reason} onClick={() => setWriting('new')}>
            Add to the background
          </Button>
        </div>
      )}
    </section>
  );
}
