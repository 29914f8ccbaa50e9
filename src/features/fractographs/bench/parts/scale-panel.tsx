import { RulerIcon } from '@phosphor-icons/react/dist/csr/Ruler';
import type { ScaleView } from '#shared/contracts/fractographs.ts';
import { formatDay } from '#shared/wording/dates.ts';
import { formatNumber } from '#shared/wording/quantity.ts';
import { Button } from '../../../../ui/button.tsx';
import { StaleRemark } from '../../../../ui/stale-remark.tsx';

type ScalePanelProps = {
  scale: ScaleView | null;
  /** Why this person cannot give the image a scale now; null where they can. */
  closedBecause: string | null;
  /** Opens the form; null while it is open. */
  onOpen: (() => void) | null;
};

/** The scale of the image with where it is from, or that it is uncalibrated and what opens that. */
export function ScalePanel({ scale, closedBecause, onOpen }: ScalePanelProps) {
  return (
    <div className="border-t border-hairline pt-[6px] text-[14px]/[1.35]">
      <h2 className="bench-title !mb-[2px] justify-between">
        Scale <RulerIcon size={15} aria-hidden />
      </h2>
      {scale ? <ScaleWords scale={scale} /> : <p>Uncalibrated: marks are read in px, and no length comes of them.</p>}
      {onOpen ? (
        <p className="mt-1">
          {closedBecause ? (
            <span className="text-ink-2">{closedBecause}</span>
          ) : (
            <Button small kind="plain" onClick={onOpen}>
              {scale ? 'Bind another scale' : 'Bind a scale'}
            </Button>
          )}
        </p>
      ) : null}
    </div>
  );
}

function ScaleWords({ scale }: { scale: ScaleView }) {
  const { pixelSizeXUm: x, pixelSizeYUm: y, relativeUncertainty } = scale;
  const size = (value: number) => `${formatNumber(value, { significantFigures: 4 })}\u00a0µm`;
  const expanded = formatNumber(2 * relativeUncertainty * 100, { significantFigures: 2 });
  return (
    <>
      <p>
        <b>{x === y ? size(x) : `${size(x)} across, ${size(y)} down`}</b> per pixel{' '}
        <span className="text-ink-2">± {expanded}&nbsp;% (k = 2)</span>
      </p>
      <p className="text-ink-2">
        {scale.code ? `${scale.code}, ` : ''}
        {scale.source}. Bound by {scale.boundBy.name}, {formatDay(scale.boundAt)}.
      </p>
      {scale.stale ? <StaleRemark>{scale.stale.why}</StaleRemark> : null}
    </>
  );
}
