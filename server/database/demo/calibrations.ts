// The image scales of the demo laboratory. Each is known to ± 0.5 % (k = 2).

export const demoInstruments = [
  { name: 'Stereo microscope', kind: 'stereo' },
  { name: 'Electron microscope', kind: 'electron' },
  { name: 'Macro camera', kind: 'camera' },
  { name: 'Compound microscope', kind: 'compound' },
] as const;

export const demoCalibrations = [
  { code: 'CAL-01', instrument: 'Stereo microscope', setting: '5×', pixelSizeUm: 2.2, asFoundErrorPercent: 0.2 },
  { code: 'CAL-02', instrument: 'Stereo microscope', setting: '10×', pixelSizeUm: 1.1, asFoundErrorPercent: 0.1 },
  { code: 'CAL-03', instrument: 'Electron microscope', setting: '250×', pixelSizeUm: 0.496, asFoundErrorPercent: 0.6 },
  { code: 'CAL-04', instrument: 'Electron microscope', setting: '1000×', pixelSizeUm: 0.124, asFoundErrorPercent: 0.4 },
  { code: 'CAL-05', instrument: 'Macro camera', setting: 'macro', pixelSizeUm: 12, asFoundErrorPercent: 0.3 },
  { code: 'CAL-06', instrument: 'Compound microscope', setting: '20×', pixelSizeUm: 0.55, asFoundErrorPercent: null },
] as const;

export type DemoCalibrationCode = (typeof demoCalibrations)[number]['code'];

/** On 5 October the reference scale behind CAL-06 was found 1.8 % out. */
export const demoReplacement = {
  code: 'CAL-06',
  on: '2026-10-05',
  pixelSizeUm: 0.5599,
  asFoundErrorPercent: 1.8,
  reason: 'Reference scale found 1.8 % out',
} as const;

export const demoExpandedUncertaintyPercent = 0.5;
