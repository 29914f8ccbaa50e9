export const materialActs = {
  'material.entered': { words: 'entered a material' },
  'material.changed': { words: 'changed a material' },
  'constant.recorded': { words: 'recorded a constant' },
  'constant.replaced': { words: 'replaced a constant' },
  'instrument.entered': { words: 'entered an instrument' },
  'calibration.recorded': { words: 'recorded a calibration' },
  'calibration.replaced': { words: 'replaced a calibration' },
} as const;
