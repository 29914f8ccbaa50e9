import { useRef } from 'react';
import { constantKindTable } from '#shared/vocabulary/constant-kinds.ts';
import { constantParts, formatConstant } from '#shared/wording/constant.ts';
import { formatDay } from '#shared/wording/dates.ts';
import { formatNumber } from '#shared/wording/quantity.ts';
import { useWidth } from '#src/ui/use-width.ts';
import type { RecordSpan } from '../records-over-time.ts';

const [heightPx, left, right, top, bottom] = [190, 44, 10, 22, 26];
const msPerDay = 86_400_000;

/** Records over time: each a box ± U high for as long as it was in force, the one in force in celadon. */
export function RecordsChart({ spans }: { spans: readonly RecordSpan[] }) {
  const frame = useRef<HTMLDivElement>(null);
  const width = useWidth(frame, 556);
  const [first, last] = [spans[0], spans[spans.length - 1]];
  if (!first || !last) return null;
  const startMs = first.fromMs;
  const endMs = Math.max(last.toMs, startMs + msPerDay);
  const [low, high] = [Math.min(...spans.map((span) => span.low)), Math.max(...spans.map((span) => span.high))];
  const room = (high - low) * 0.12;
  const x = (ms: number) => left + ((ms - startMs) / (endMs - startMs)) * (width - left - right);
  const y = (value: number) => top + ((high + room - value) / (high - low + 2 * room)) * (heightPx - top - bottom);
  const words = spans.map(({ constant }) => `record ${constant.recordNumber} ${formatConstant(constant)}`).join(', ');
  return (
    <div ref={frame} className="overflow-hidden">
      <svg
        width={width}
        height={heightPx}
        role="img"
        aria-label={`Records over time, plus or minus U at k = 2: ${words}`}
      >
        <text x={0} y={13} fontSize={12.5} fill="var(--ink-2)">
          {constantParts(last.constant).unit}
        </text>
        {[low, (low + high) / 2, high].map((value) => (
          <g key={value}>
            <path d={`M${left} ${y(value)}H${width - right}`} stroke="var(--hairline)" />
            <text x={left - 7} y={y(value) + 4} textAnchor="end" fontSize={12.5} fill="var(--ink-2)">
              {formatNumber(value, { atMostFigures: 3 })}
            </text>
          </g>
        ))}
        {spans.map(({ constant, fromMs, toMs, low: foot, high: head, inForce }) => {
          const boxWidth = Math.max(6, x(toMs) - x(fromMs));
          const start = Math.min(x(fromMs), width - right - boxWidth);
          return (
            <g key={constant.id}>
              <rect
                {...{ x: start, y: y(head), width: boxWidth, height: y(foot) - y(head) }}
                fill={inForce ? 'var(--celadon-wash)' : 'var(--well)'}
                stroke={inForce ? 'var(--celadon)' : 'var(--control)'}
              />
              <path
                d={`M${start} ${y(constant.value)}h${boxWidth}`}
                stroke={inForce ? 'var(--celadon)' : 'var(--ink-2)'}
                strokeWidth={1.6}
              />
              <text x={start + 4} y={y(head) - 5} fontSize={12.5} fill="var(--ink)" fontWeight={inForce ? 600 : 400}>
                {boxWidth > 60 ? `${constant.recordNumber}, ${constant.sourceStanding}` : constant.recordNumber}
              </text>
            </g>
          );
        })}
        <path d={`M${left} ${heightPx - bottom}H${width - right}`} stroke="var(--control)" />
        <text x={left} y={heightPx - 8} fontSize={12.5} fill="var(--ink-2)">
          {formatDay(new Date(startMs).toISOString())}
        </text>
        <text x={width - right} y={heightPx - 8} textAnchor="end" fontSize={12.5} fill="var(--ink-2)">
          today
        </text>
      </svg>
      <p className="sr-only">{constantKindTable[last.constant.kind].word}</p>
    </div>
  );
}
