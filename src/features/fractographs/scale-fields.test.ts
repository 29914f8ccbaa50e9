import { describe, expect, it } from 'vitest';
import { FractographView } from '#shared/contracts/fractographs.ts';
import { fieldsOf, readDescription } from './describe-fields.ts';
import { missingFacts } from './scale-in-words.ts';
import { emptyScaleFields, readScaleFields } from './scale-fields.ts';

const image = FractographView.parse({
  id: '01900000-0000-7000-8000-000000000001',
  figureNumber: 2,
  fileName: 'face.tif',
  bytes: 10,
  sha256: 'a'.repeat(64),
  state: 'ready',
  refusedReason: null,
  progress: 1,
  format: 'TIFF',
  widthPx: 1600,
  heightPx: 1200,
  bitDepth: 8,
  tagPixelSizeUm: 1.1,
  tagSource: 'TIFF resolution 9 090.9 px/cm',
  caption: 'Origin',
  fragment: null,
  face: 'A',
  view: 'origin',
  standing: 'record',
  instrument: null,
  objective: null,
  fieldWidthMm: null,
  tiltDeg: null,
  illumination: null,
  detector: null,
  coating: 'none',
  takenBy: null,
  takenOn: null,
  broughtInBy: { id: '01900000-0000-7000-8000-000000000002', name: 'Ana Lyst' },
  broughtInAt: '2026-10-19T09:00:00.000Z',
  sameBytesAs: [],
  mateId: null,
  scale: null,
  markCount: 0,
  version: 1,
});

const across = (length: number) => ({ from: { x: 0, y: 0 }, to: { x: length, y: 0 } });
const barOf = (barLength: string) => ({ ...emptyScaleFields(image), way: 'burned bar' as const, barLength });

describe('the form of a scale', () => {
  it('takes the bar length in the unit it is typed in, and keeps the typing', () => {
    const read = readScaleFields(barOf('0.2 mm'), image, [across(180), across(181)]);
    expect(read).toMatchObject({ way: 'burned bar', typed: '0.2 mm' });
    expect('barLengthUm' in read && read.barLengthUm).toBeCloseTo(200, 9);
    expect('barStandardUncertaintyUm' in read && read.barStandardUncertaintyUm).toBeCloseTo(0.5, 9);
  });

  it('takes a bare number for µm', () => {
    expect(readScaleFields(barOf('200'), image, [across(180), across(181)])).toMatchObject({ typed: '200 µm' });
  });

  it('wants a bar above 0 µm that was drawn along twice', () => {
    expect(readScaleFields(barOf('0'), image, [across(180), across(181)])).toMatchObject({ field: 'barLength' });
    expect(readScaleFields(barOf('200'), image, [across(180)])).toMatchObject({ field: 'readings' });
  });

  it('wants to know where a typed size is from', () => {
    const typed = { ...emptyScaleFields(image), way: 'typed' as const, pixelSizeX: '1.1' };
    expect(readScaleFields(typed, image, [])).toMatchObject({ field: 'source' });
    const whole = { ...typed, pixelSizeY: '1.27', source: 'sheet of the microscope' };
    expect(readScaleFields(whole, image, [])).toMatchObject({ way: 'typed', relativeUncertainty: 0.01 });
  });

  it('begins with what the file says, where it says something', () => {
    expect(emptyScaleFields(image).way).toBe('file tags');
    expect(emptyScaleFields({ ...image, tagPixelSizeUm: null }).way).toBe('burned bar');
  });
});

describe('the description of an image', () => {
  it('comes out of its form as it went in', () => {
    expect(readDescription(fieldsOf(image))).toMatchObject({
      caption: 'Origin',
      face: 'A',
      coating: 'none',
      tiltDeg: null,
    });
  });

  it('reads a field width in any length and a tilt in degrees', () => {
    const read = readDescription({ ...fieldsOf(image), fieldWidth: '850 µm', tilt: '30°' });
    expect('fieldWidthMm' in read && read.fieldWidthMm).toBeCloseTo(0.85, 9);
    expect(read).toMatchObject({ tiltDeg: 30 });
  });

  it('says at which field a number can’t be read', () => {
    expect(readDescription({ ...fieldsOf(image), fieldWidth: '850 MPa' })).toMatchObject({ field: 'fieldWidth' });
    expect(readDescription({ ...fieldsOf(image), tilt: 'steep' })).toMatchObject({ field: 'tilt' });
  });

  it('lists what is not told and guesses none of it', () => {
    expect(missingFacts(image)).toEqual([
      'piece',
      'instrument',
      'objective',
      'field width',
      'tilt',
      'light',
      'who took it',
      'date taken',
    ]);
  });
});
