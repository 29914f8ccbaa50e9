import type { CalibrationView } from '#shared/contracts/calibrations.ts';
import { formatShortDay } from '#shared/wording/dates.ts';
import { formatNumber } from '#shared/wording/quantity.ts';
import { Button } from '#src/ui/button.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';

type CalibrationTableProps = {
  calibrations: readonly CalibrationView[];
  /** Left out for those who may only read. */
  onReplace?: (calibration: CalibrationView) => void;
};

/** Instruments with their calibrations; a replaced one stays readable and says by which. */
export function CalibrationTable({ calibrations, onReplace }: CalibrationTableProps) {
  return (
    <Table caption="Instruments and their scales" stacked>
      <thead>
        <tr>
          <Th>Instrument</Th>
          <Th>Calibration</Th>
          <Th numeric>Scale</Th>
          <Th numeric>± U (k = 2)</Th>
          <Th>Reference</Th>
          <Th numeric>As found</Th>
          <Th>In force</Th>
          <Th hidden>Acts</Th>
        </tr>
      </thead>
      <tbody>
        {calibrations.map((calibration, index) => (
          <tr key={calibration.id}>
            <th scope="row" data-word="Instrument">
              <span
                className={
                  calibrations[index - 1]?.instrument.id === calibration.instrument.id
                    ? 'sr-only narrow:not-sr-only'
                    : undefined
                }
              >
                {calibration.instrument.name}
              </span>
            </th>
            <td data-word="Calibration" className="whitespace-nowrap">
              {calibration.code} {calibration.setting}
            </td>
            <td className="num" data-word="Scale">
              {scaleWords(calibration)}
            </td>
            <td className="num" data-word="± U (k = 2)">
              {formatNumber(calibration.relativeUncertainty * 200, { significantFigures: 2 })} %
            </td>
            <td data-word="Reference">{calibration.source}</td>
            <td className="num" data-word="As found">
              <AsFound percent={calibration.asFoundErrorPercent} />
            </td>
            <td data-word="In force">{inForceWords(calibration)}</td>
            <td>
              {onReplace && !calibration.replacedBy ? (
                <Button small kind="plain" onClick={() => onReplace(calibration)}>
                  Replace it
                </Button>
              ) : null}
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

function AsFound({ percent }: { percent: number | null }) {
  if (percent === null) return <span className="text-ink-2">none told</span>;
  const words = `${formatNumber(percent)} %`;
  // More than the largest U of a usual calibration: lengths read before are out by more than they say.
  return Math.abs(percent) > 1 ? <b className="text-iron">{words} out</b> : words;
}

function scaleWords({ pixelSizeXUm, pixelSizeYUm }: CalibrationView): string {
  const size = (value: number) => formatNumber(value, { significantFigures: 4 });
  return pixelSizeXUm === pixelSizeYUm
    ? `${size(pixelSizeXUm)} µm/px`
    : `${size(pixelSizeXUm)} × ${size(pixelSizeYUm)} µm/px`;
}

function inForceWords({ validFrom, replacedBy }: CalibrationView): string {
  if (replacedBy) return `replaced by ${replacedBy.code}, ${formatShortDay(replacedBy.validFrom)}`;
  return `since ${formatShortDay(validFrom)}`;
}
