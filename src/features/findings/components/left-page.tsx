import { CheckIcon } from '@phosphor-icons/react/dist/csr/Check';
import { CircleDashedIcon } from '@phosphor-icons/react/dist/csr/CircleDashed';
import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { PersonWriting } from '#src/collaboration/findings-text.ts';
import { StaleGlyph } from '#src/ui/glyphs/stale-glyph.tsx';
import { joinClasses } from '#src/ui/join-classes.ts';
import { Quantity } from '#src/ui/quantity.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Th } from '#src/ui/th.tsx';
import { boundValuesOf, figuresOf } from '../api.ts';
import type { Part, Placed } from '../editor/outline.ts';
import { Versions } from './versions.tsx';
import { toneOf } from './tone-of.ts';

type Outline = { parts: Part[]; placed: Placed[] };
type LeftPageProps = {
  number: string;
  outline: Outline;
  people: readonly PersonWriting[];
  isKept: boolean;
  mayWrite: boolean;
  onJump: (part: Part) => void;
};

/** Where the text stands: its parts and who writes in them, what is bound, and what is left before review. */
export function LeftPage({ number, outline, people, isKept, mayWrite, onJump }: LeftPageProps) {
  return (
    <>
      <section>
        <RuleHead small>Outline</RuleHead>
        <OutlineList outline={outline} people={people} onJump={onJump} />
      </section>
      <section>
        <RuleHead small>Values bound in this text</RuleHead>
        <BoundTable number={number} placed={outline.placed} />
      </section>
      <section>
        <RuleHead small>Toward review</RuleHead>
        <TowardReview number={number} outline={outline} isKept={isKept} />
      </section>
      <section>
        <RuleHead small>Versions</RuleHead>
        <Versions number={number} mayKeep={mayWrite && isKept} mayWrite={mayWrite} />
      </section>
    </>
  );
}

function OutlineList({ outline, people, onJump }: Pick<LeftPageProps, 'outline' | 'people' | 'onJump'>) {
  const own = people.find((each) => each.isSelf)?.part;
  return (
    <ol className="findings-outline">
      {outline.parts.map((part) => {
        const writers = people.filter((each) => each.part === part.number && each.mayWrite);
        return (
          <li key={part.at} aria-current={own === part.number ? 'true' : undefined}>
            <button type="button" onClick={() => onJump(part)}>
              <span className="n">{part.number}</span>
              <span>{part.title === '' ? 'untitled' : part.title}</span>
              <span className="w">
                {writers.length > 0
                  ? writers.map((each) => (
                      <span
                        key={each.clientId}
                        className={each.isSelf ? 'is-self' : `is-other-${toneOf(people, each.personId)}`}
                      >
                        {each.isSelf ? 'you' : each.name.split(' ')[0]}{' '}
                      </span>
                    ))
                  : part.isEmpty
                    ? 'empty'
                    : ''}
              </span>
            </button>
          </li>
        );
      })}
    </ol>
  );
}

function BoundTable({ number, placed }: { number: string; placed: readonly Placed[] }) {
  const { data: values = [] } = useQuery(boundValuesOf(number));
  const { data: figures = [] } = useQuery(figuresOf(number));
  const once = [...new Map(placed.map((each) => [each.id, each])).values()];
  const partsOf = (id: string) => [...new Set(placed.filter((each) => each.id === id).map((each) => each.part))];
  const rows = once.flatMap(({ id }) => {
    const value = values.find((each) => each.id === id);
    const figure = figures.find((each) => each.id === id);
    const reads = value ? <Quantity {...value.parts} stale={value.stale !== null} /> : figure?.caption;
    const words = value?.words ?? (figure ? `Fig. ${figure.figureNumber}` : null);
    return words === null ? [] : [{ id, words, reads, parts: partsOf(id).join(', ') }];
  });
  if (rows.length === 0)
    return <p className="text-s text-ink-2">None yet. Bind one with Ctrl K instead of typing it.</p>;
  return (
    <table className="findings-bound">
      <thead>
        <tr>
          <Th>Value</Th>
          <Th numeric>Reads</Th>
          <Th numeric>In</Th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ id, words, reads, parts }) => (
          <tr key={id}>
            <td>{words}</td>
            <td className="num">{reads}</td>
            <td className="num text-ink-2">{parts}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function TowardReview({ number, outline, isKept }: { number: string; outline: Outline; isKept: boolean }) {
  const { data: values = [] } = useQuery(boundValuesOf(number));
  const { data: figures = [] } = useQuery(figuresOf(number));
  const stale = new Set([...values, ...figures].filter((each) => each.stale).map((each) => each.id));
  const known = new Set([...values, ...figures].map((each) => each.id));
  const stalePlaced = outline.placed.filter((each) => stale.has(each.id));
  const unknown = outline.placed.filter((each) => !known.has(each.id)).length;
  const empty = outline.parts.filter((part) => part.isEmpty);
  return (
    <>
      <ul className="findings-way">
        {stalePlaced.length > 0 ? (
          <Way tone="iron" glyph={<StaleGlyph />}>
            <b>{counted(stalePlaced.length, 'value')} stale</b>, in {listed(partNumbers(stalePlaced))}
          </Way>
        ) : (
          <Way tone="done" glyph={<CheckIcon size={15} aria-hidden />}>
            No stale value in the text
          </Way>
        )}
        {unknown > 0 ? (
          <Way tone="iron" glyph={<StaleGlyph />}>
            <b>{counted(unknown, 'value')}</b> not of this case
          </Way>
        ) : null}
        {empty.length > 0 ? (
          <Way glyph={<CircleDashedIcon size={15} aria-hidden />}>
            {empty.length === 1 ? 'Part' : 'Parts'} {listed(empty.map((part) => part.number))}{' '}
            {empty.length === 1 ? 'is' : 'are'} empty
          </Way>
        ) : (
          <Way tone="done" glyph={<CheckIcon size={15} aria-hidden />}>
            Every part is written
          </Way>
        )}
        {isKept ? null : <Way glyph={<CircleDashedIcon size={15} aria-hidden />}>Something is not kept yet</Way>}
      </ul>
      <p className="text-s">
        <Link to={`/cases/${number}/review`}>All that is open, and the way to review</Link>
      </p>
    </>
  );
}

function Way({ tone, glyph, children }: { tone?: 'done' | 'iron'; glyph: ReactNode; children: ReactNode }) {
  return (
    <li className={joinClasses(tone && `is-${tone}`)}>
      {glyph}
      <span>{children}</span>
    </li>
  );
}

const counted = (count: number, word: string) => `${count === 1 ? 'One' : count} ${word}${count === 1 ? '' : 's'}`;
const partNumbers = (placed: readonly Placed[]) => [...new Set(placed.map((each) => each.part))];
const listed = (numbers: readonly number[]) =>
  numbers.length < 2 ? numbers.join('') : `${numbers.slice(0, -1).join(', ')} and ${numbers.at(-1)}`;
