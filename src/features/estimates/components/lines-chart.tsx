import { LinePoint } from '#src/ui/glyphs/line-glyph.tsx';
import { reckonedLines, sharedStressesMPa, sharedWords, stressParts } from './evidence-line.ts';
import type { EvidenceLine, ReckonedLine } from './evidence-line.ts';
import { stressAxis, type StressAxis } from './stress-axis.ts';

const narrowUnderPx = 430;

/** Where things stand in the drawing, px of screen. */
type Place = {
  width: number;
  narrow: boolean;
  left: number;
  right: number;
  axisY: number;
  x: (stressMPa: number) => number;
};

function placeFor(rows: readonly EvidenceLine[], width: number, axis: StressAxis): Place {
  const narrow = width < narrowUnderPx;
  const left = narrow ? 14 : 100;
  const right = narrow ? width - 14 : width - 128;
  const axisY = narrow ? 26 + rows.length * 62 : 28 + rows.length * 56;
  const x = (stressMPa: number) => left + ((stressMPa - axis.from) / (axis.to - axis.from)) * (right - left);
  return { width, narrow, left, right, axisY, x };
}

/** The drawing at its true size: no part of it is scaled, so that type keeps its size at every width. */
export function LinesChart({ rows, width }: { rows: readonly EvidenceLine[]; width: number }) {
  const ends = reckonedLines(rows).flatMap((row) => [
    row.value - row.expandedUncertainty,
    row.value + row.expandedUncertainty,
  ]);
  const axis = stressAxis(ends);
  const place = placeFor(rows, width, axis);
  const height = place.axisY + 26;
  return (
    <svg width={width} height={height} viewBox={`0 0 ${width} ${height}`} className="block" fill="none" aria-hidden>
      <Shared rows={rows} place={place} />
      {rows.map((row, index) => (
        <Row key={index} row={row} place={place} y={place.narrow ? 64 + 62 * index : 50 + 56 * index} />
      ))}
      <Axis axis={axis} place={place} />
    </svg>
  );
}

function Shared({ rows, place }: { rows: readonly EvidenceLine[]; place: Place }) {
  const words = sharedWords(rows);
  if (!words) return null;
  const shared = sharedStressesMPa(rows);
  const half = words.length * 3.1;
  const wanted = shared ? place.x((shared.from + shared.to) / 2) : (place.left + place.right) / 2;
  const middle = Math.min(Math.max(wanted, half), place.width - half);
  return (
    <>
      {shared ? (
        <>
          <rect
            x={place.x(shared.from)}
            y="20"
            width={place.x(shared.to) - place.x(shared.from)}
            height={place.axisY - 20}
            fill="var(--celadon-wash)"
          />
          <path
            d={`M${place.x(shared.from)} 20V${place.axisY}M${place.x(shared.to)} 20V${place.axisY}`}
            stroke="var(--celadon)"
            strokeDasharray="2 3"
          />
        </>
      ) : null}
      <text
        x={middle}
        y="13"
        fontSize="12.5"
        fontWeight="600"
        textAnchor="middle"
        fill={shared ? 'var(--celadon)' : 'var(--iron)'}
      >
        {words}
      </text>
    </>
  );
}

function Row({ row, place, y }: { row: EvidenceLine; place: Place; y: number }) {
  const [reckoned] = reckonedLines([row]);
  const labelY = place.narrow ? y - 22 : y + 1;
  return (
    <g color={row.setAside ? 'var(--ink-3)' : 'var(--ink)'} fill="currentColor">
      <text x="0" y={labelY} fontSize="16" fontWeight="600">
        {row.label}
      </text>
      {place.narrow ? null : (
        <text x="0" y={y + 18} fontSize="12.5" fill="var(--ink-2)">
          {row.setAside ? 'set aside' : row.sublabel}
        </text>
      )}
      <path d={`M${place.left} ${y}H${place.right}`} stroke="var(--hairline)" />
      {reckoned ? (
        <>
          <Interval row={reckoned} place={place} y={y} />
          <StressText row={reckoned} x={place.width - 1} y={place.narrow ? y - 22 : y + 5.5} />
        </>
      ) : (
        <text
          x={place.width - 1}
          y={place.narrow ? y - 22 : y + 5}
          textAnchor="end"
          fontSize="13.5"
          fill="var(--ink-3)"
        >
          not reckoned
        </text>
      )}
    </g>
  );
}

function Interval({ row, place, y }: { row: ReckonedLine; place: Place; y: number }) {
  const from = place.x(row.value - row.expandedUncertainty);
  const to = place.x(row.value + row.expandedUncertainty);
  return (
    <>
      <path d={`M${from} ${y - 6}v12M${to} ${y - 6}v12`} stroke="currentColor" strokeWidth="1.6" />
      <path
        d={`M${from} ${y}H${to}`}
        stroke="currentColor"
        strokeWidth="2.4"
        strokeDasharray={row.stale ? '6 3.5' : undefined}
      />
      <LinePoint line={row.line} x={place.x(row.value)} y={y} hollow={row.stale} />
    </>
  );
}

function StressText({ row, x, y }: { row: ReckonedLine; x: number; y: number }) {
  const { value, plusMinus, unit } = stressParts(row);
  const widthPx = value.length * 9 + (plusMinus.length + 3) * 8 + unit.length * 8.6;
  return (
    <>
      <text x={x} y={y} textAnchor="end" fontSize="18" fontWeight="600">
        {value}
        <tspan fontWeight="400" fill="var(--ink-2)">
          {`\u00a0±\u00a0${plusMinus}\u00a0`}
          <tspan fontSize="14">{unit}</tspan>
        </tspan>
      </text>
      {row.stale ? (
        <path d={`M${x - widthPx} ${y + 6}H${x}`} stroke="var(--iron)" strokeWidth="1.6" strokeDasharray="4 3" />
      ) : null}
    </>
  );
}

function Axis({ axis, place }: { axis: StressAxis; place: Place }) {
  const y = place.axisY;
  const ticks = [
    ...axis.major.map((stress) => `M${place.x(stress)} ${y}v6`),
    ...axis.minor.map((stress) => `M${place.x(stress)} ${y}v3.5`),
  ];
  const last = axis.major.length - 1;
  return (
    <>
      <path d={`M${place.left} ${y}H${place.right}${ticks.join('')}`} stroke="var(--control)" />
      <g fontSize="12.5" fill="var(--ink-2)">
        {axis.major.map((stress, index) => (
          <text
            key={stress}
            x={place.x(stress)}
            y={y + 21}
            textAnchor={place.narrow && index === last ? 'end' : 'middle'}
          >
            {place.narrow && index === last ? `${stress}\u00a0MPa,\u00a0k\u00a0=\u00a02` : stress}
          </text>
        ))}
        {place.narrow ? null : (
          <text x={place.width - 1} y={y + 21} textAnchor="end">
            MPa, <tspan fontStyle="italic">k</tspan> = 2
          </text>
        )}
      </g>
    </>
  );
}
