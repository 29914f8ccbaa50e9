import { useQuery } from '@tanstack/react-query';
import type { BarReading, FractographView } from '#shared/contracts/fractographs.ts';
import { formatNumber } from '#shared/wording/quantity.ts';
import { Button } from '#src/ui/button.tsx';
import { ButtonLink } from '#src/ui/button-link.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { UnitField } from '#src/ui/unit-field.tsx';
import { calibrationsOffered } from '../api.ts';
import { lengthsOf, type FieldFault, type ScaleFields } from '../scale-fields.ts';

type ScaleWayFieldsProps = {
  number: string;
  image: FractographView;
  barReadings: readonly BarReading[];
  onDrawBar?: () => void;
  onClearBar?: () => void;
  fields: ScaleFields;
  fault: FieldFault | null;
  onChange: (changed: Partial<ScaleFields>) => void;
};

/** The fields that belong to the chosen way. */
export function ScaleWayFields(props: ScaleWayFieldsProps) {
  if (props.fields.way === 'burned bar') return <BarFields {...props} />;
  if (props.fields.way === 'kept calibration') return <KeptFields {...props} />;
  return props.fields.way === 'file tags' ? <TagFields {...props} /> : <TypedFields {...props} />;
}

type Named = keyof Omit<ScaleFields, 'way'>;

function entryOf({ fields, onChange }: ScaleWayFieldsProps, name: Named) {
  return {
    value: fields[name],
    onChange: (event: { currentTarget: { value: string } }) => onChange({ [name]: event.currentTarget.value }),
  };
}

const faultAt = ({ fault }: ScaleWayFieldsProps, name: Named) => (fault?.field === name ? fault.why : undefined);

function BarFields(props: ScaleWayFieldsProps) {
  const { barReadings, onDrawBar, onClearBar, image, number } = props;
  const lengths = lengthsOf(barReadings);
  return (
    <>
      <div className="grid grid-cols-2 items-start gap-4 narrow:grid-cols-1">
        <UnitField
          label="Length of the scale bar"
          unit="µm"
          entry={entryOf(props, 'barLength')}
          error={faultAt(props, 'barLength')}
          help="As written beside the bar; another unit may be typed: 0.2 mm"
        />
        <UnitField
          label="How well the bar is known, ± U"
          unit="%"
          entry={entryOf(props, 'barUncertaintyPercent')}
          error={faultAt(props, 'barUncertaintyPercent')}
          help="k = 2"
        />
      </div>
      <div>
        <p>
          {lengths.length === 0
            ? 'Draw along the bar on the image, twice.'
            : `Read ${lengths.map((length) => `${formatNumber(length)} px`).join(', ')}${lengths.length < 2 ? '; draw along it once more.' : '.'}`}
        </p>
        <div className="acts mt-2">
          {onDrawBar ? (
            <Button small onClick={onDrawBar}>
              Draw along the bar
            </Button>
          ) : (
            <ButtonLink small to={`/cases/${number}/fractographs/${image.id}?scale`}>
              Read the bar on the bench
            </ButtonLink>
          )}
          {onClearBar && lengths.length > 0 ? (
            <Button small kind="plain" onClick={onClearBar}>
              Read it afresh
            </Button>
          ) : null}
        </div>
      </div>
    </>
  );
}

function TagFields(props: ScaleWayFieldsProps) {
  const { tagPixelSizeUm, tagSource } = props.image;
  if (tagPixelSizeUm === null) return <p>This file tells no pixel size of itself. Choose another way.</p>;
  return (
    <>
      <p>
        The file says <b>{formatNumber(tagPixelSizeUm, { significantFigures: 5 })} µm per pixel</b> ({tagSource}). Was
        it written by the instrument the image was taken with, and not resized since?
      </p>
      <Uncertainty {...props} />
    </>
  );
}

function TypedFields(props: ScaleWayFieldsProps) {
  return (
    <>
      <div className="grid grid-cols-2 items-start gap-4 narrow:grid-cols-1">
        <UnitField
          label="Pixel size across"
          unit="µm"
          entry={entryOf(props, 'pixelSizeX')}
          error={faultAt(props, 'pixelSizeX')}
        />
        <UnitField
          label="Pixel size down"
          unit="µm"
          entry={entryOf(props, 'pixelSizeY')}
          error={faultAt(props, 'pixelSizeY')}
          help="Empty where it is the same"
        />
      </div>
      <Uncertainty {...props} />
      <TextField
        label="Where it is from"
        {...entryOf(props, 'source')}
        error={faultAt(props, 'source')}
        help="A certificate, the sheet of the instrument, a graticule"
      />
    </>
  );
}

function Uncertainty(props: ScaleWayFieldsProps) {
  return (
    <UnitField
      label="Uncertainty of the pixel size, ± U"
      unit="%"
      entry={entryOf(props, 'uncertaintyPercent')}
      error={faultAt(props, 'uncertaintyPercent')}
      help="k = 2"
    />
  );
}

function KeptFields(props: ScaleWayFieldsProps) {
  const { data } = useQuery(calibrationsOffered);
  const inForce = data?.filter(({ replacedBy }) => replacedBy === null) ?? [];
  return (
    <SelectField
      label="Calibration"
      {...entryOf(props, 'calibrationId')}
      error={faultAt(props, 'calibrationId')}
      help="Those in force; a replaced one is bound to no further image."
    >
      <option value="">choose</option>
      {inForce.map(({ id, code, instrument, setting, pixelSizeXUm }) => (
        <option key={id} value={id}>
          {code} {instrument.name} {setting}, {formatNumber(pixelSizeXUm, { significantFigures: 4 })} µm/px
        </option>
      ))}
    </SelectField>
  );
}
