import { laboratoryRoles, type OrganisationKind, type Role } from '../vocabulary/roles.ts';

/** What is wrong with these roles in an organisation of that kind, as a sentence; null when they may be held. */
export function rolesFault(roles: readonly Role[], kind: OrganisationKind): string | null {
  if (roles.length === 0) return 'Choose at least one role.';
  if (kind === 'laboratory') return null;
  const reserved = roles.filter((role) => laboratoryRoles.some((own) => own === role));
  if (reserved.length === 0) return null;
  return `Only the laboratory's own people are ${reserved.join(' or ')}; choose engineer or requester here.`;
}
