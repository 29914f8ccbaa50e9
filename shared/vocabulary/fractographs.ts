export const fractographStates = ['receiving', 'checking', 'cutting tiles', 'ready', 'refused'] as const;
export type FractographState = (typeof fractographStates)[number];

export const fractographViews = ['overall', 'face', 'mirror', 'origin', 'detail', 'side', 'mate'] as const;
export type FractographView = (typeof fractographViews)[number];

export const fractographStandings = ['record', 'working'] as const;
export type FractographStanding = (typeof fractographStandings)[number];

/** How a calibration was obtained. */
export const calibrationWays = ['file tags', 'burned bar', 'graticule', 'typed'] as const;
export type CalibrationWay = (typeof calibrationWays)[number];
