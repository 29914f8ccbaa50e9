export const roles = ['analyst', 'engineer', 'manager', 'requester', 'administrator'] as const;
export type Role = (typeof roles)[number];

export const organisationKinds = ['laboratory', 'maker', 'outside'] as const;
export type OrganisationKind = (typeof organisationKinds)[number];

/** Roles that only people of the laboratory itself may hold. */
export const laboratoryRoles = ['analyst', 'manager', 'administrator'] as const satisfies readonly Role[];

export const accountStates = ['invited', 'open', 'closed'] as const;
export type AccountState = (typeof accountStates)[number];
