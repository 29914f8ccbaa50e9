export const fragmentWays = ['break', 'cut', 'replica', 'section', 'powder'] as const;
export type FragmentWay = (typeof fragmentWays)[number];

export const fragmentStatuses = ['present', 'missing', 'consumed'] as const;
export type FragmentStatus = (typeof fragmentStatuses)[number];

/** May the origin lie on a piece that is not there? While not known, a limit sentence stands in the findings. */
export const originLies = ['no', 'not known', 'yes'] as const;
export type OriginLies = (typeof originLies)[number];

export const faces = ['A', 'B'] as const;
export type Face = (typeof faces)[number];
