import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { StaffRow } from '#shared/contracts/casebook.ts';
import type { LineageKind } from '#shared/vocabulary/lineage-kinds.ts';
import { daysBetween, formatAge, formatShortDay } from '#shared/wording/dates.ts';
import { ExposedGlyph } from '#src/ui/glyphs/exposed-glyph.tsx';
import { GlyphWord } from '#src/ui/glyph-word.tsx';
import { joinClasses } from '#src/ui/join-classes.ts';
import { StaleRemark } from '#src/ui/stale-remark.tsx';
import { OriginWord } from './origin-word.tsx';
import { StateWord } from './state-word.tsx';

type CasebookRowProps = {
  row: StaffRow;
  asOf: string;
  /** The longest age on the page, days: the length of the whole age bar. */
  oldestDays: number;
  personId: string;
  /** What its lines of evidence say. */
  lines: ReactNode;
};

const ageBarWidthPx = 34;

/** What it was that changed, short enough for the margin; the whole of it stands in its title and in the case. */
const changedWords: Record<LineageKind, string> = {
  fractograph: 'image replaced',
  calibration: 'scale replaced',
  'calibration binding': 'scale changed',
  'mark version': 'mark moved',
  measurement: 'length read anew',
  'material constant': 'constant revised',
  estimate: 'estimate remade',
  comparison: 'comparison remade',
  'bound value': 'value taken anew',
  figure: 'figure drawn anew',
};

/** A case in the Casebook, for the laboratory. */
export function CasebookTableRow({ row, asOf, oldestDays, personId, lines }: CasebookRowProps) {
  const days = daysBetween(row.receivedAt, row.closedAt ?? asOf);
  const gone = row.state === 'withdrawn';
  const year = new Date(asOf).getUTCFullYear();
  return (
    <tr>
      <td className="is-picture w-[88px]">
        <OriginPicture row={row} />
      </td>
      <td className="mono whitespace-nowrap">
        <Link to={`/cases/${row.number}`}>{row.number}</Link>
      </td>
      <td
        className={joinClasses('is-wide min-w-[150px] [overflow-wrap:anywhere]', gone ? 'text-ink-3' : 'font-semibold')}
      >
        {row.title}
        {row.urgency === 'exposed now' && !row.closedAt && !gone ? (
          <span className="block text-s text-iron">
            <GlyphWord glyph={<ExposedGlyph />}>exposed now</GlyphWord>
          </span>
        ) : null}
      </td>
      <td className="is-wide whitespace-nowrap text-ink-2 max-[1240px]:hidden narrow:!block" data-word="of">
        {row.material ?? <span className="text-ink-3">not said yet</span>}
      </td>
      <td className="is-state is-wide">
        <StateWord state={row.state} holdUntil={row.holdUntil} />
      </td>
      <td className="w-[92px] whitespace-nowrap narrow:col-start-3 narrow:row-start-1 narrow:justify-self-end">
        <span className="mr-[9px] inline-block w-9 text-right narrow:mr-0 narrow:w-auto">{formatAge(days)}</span>
        <i
          className="inline-block h-[5px] bg-rule align-[2px] fold:hidden"
          style={{ width: Math.max(1, Math.round((ageBarWidthPx * days) / Math.max(1, oldestDays))) }}
        />
      </td>
      <td
        className={joinClasses('is-wide whitespace-nowrap', row.assignedTo?.id === personId && 'font-semibold')}
        data-word="with"
      >
        {row.assignedTo?.name ?? <span className="font-normal text-ink-3">no one yet</span>}
      </td>
      <td className="is-wide whitespace-nowrap">
        {row.originCode ? (
          <OriginWord code={row.originCode} />
        ) : (
          <span className="text-ink-3">{noOriginWords(row)}</span>
        )}
      </td>
      <td className="is-wide whitespace-nowrap" data-word="lines">
        {lines}
      </td>
      <td className="is-remark is-wide">
        {row.stale ? (
          <StaleRemark>
            <span title={row.stale.why}>
              {changedWords[row.stale.cause]} {formatShortDay(row.stale.since, year)}
            </span>
          </StaleRemark>
        ) : null}
      </td>
    </tr>
  );
}

/** Where no origin is marked: whether one was looked for. */
function noOriginWords({ hasFractographs, closedAt }: StaffRow): string {
  if (!hasFractographs) return 'not looked for';
  return closedAt ? 'not found' : 'not found yet';
}

/** The crop at the origin; where there is none, the place says so in words. */
function OriginPicture({ row }: { row: StaffRow }) {
  if (!row.picture)
    return (
      <span className="flex h-[37px] w-[72px] items-center justify-center border border-dashed border-rule text-xs text-ink-3 narrow:h-[55px] narrow:w-[104px]">
        {row.hasFractographs ? 'no origin' : 'none yet'}
      </span>
    );
  const { fractographId, x, y, acrossPx } = row.picture;
  const frame = `x=${Math.round(x)}&y=${Math.round(y)}&across=${acrossPx}&width=144&height=74`;
  return (
    <img
      src={`/api/cases/${row.number}/fractographs/${fractographId}/crop?${frame}`}
      alt={`Origin of ${row.number}`}
      width={72}
      height={37}
      loading="lazy"
      className="h-[37px] w-[72px] bg-well object-cover narrow:h-[55px] narrow:w-[104px]"
    />
  );
}
