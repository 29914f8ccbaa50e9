import type { OrganisationKind, Role } from '#shared/vocabulary/roles.ts';

// Invented throughout: no such firm or person is meant, and .example never leaves this machine.

export const demoOrganisations = [
  { name: 'Marrowdene Fracture Laboratory', kind: 'laboratory' },
  { name: 'Ostrevell Ceramics', kind: 'maker' },
  { name: 'Pellgrove Line Company', kind: 'outside' },
  { name: 'Cindermoor Dental Studio', kind: 'outside' },
  { name: 'Hexlund Tooling', kind: 'outside' },
  { name: 'Vantrisse Glazing', kind: 'outside' },
] as const satisfies readonly { name: string; kind: OrganisationKind }[];

export type DemoOrganisation = (typeof demoOrganisations)[number]['name'];

type DemoPerson = { mail: string; name: string; organisation: DemoOrganisation; roles: readonly Role[] };

const laboratory = 'Marrowdene Fracture Laboratory';
const maker = 'Ostrevell Ceramics';

export const demoPeople = [
  { mail: 'intake@marrowdene.example', name: 'Wenna Tolland', organisation: laboratory, roles: ['analyst'] },
  { mail: 'analyst-oxide@marrowdene.example', name: 'Ilse Varga', organisation: laboratory, roles: ['analyst'] },
  { mail: 'analyst-glass@marrowdene.example', name: 'Tomé Okonjo', organisation: laboratory, roles: ['analyst'] },
  { mail: 'analyst-dental@marrowdene.example', name: 'Sunniva Dhar', organisation: laboratory, roles: ['analyst'] },
  { mail: 'second-reader@marrowdene.example', name: 'Maren Rask', organisation: laboratory, roles: ['analyst'] },
  {
    mail: 'laboratory-manager@marrowdene.example',
    name: 'Piet Alvarado',
    organisation: laboratory,
    roles: ['manager'],
  },
  { mail: 'deputy-manager@marrowdene.example', name: 'Oda Ferreline', organisation: laboratory, roles: ['manager'] },
  { mail: 'lot-engineer-2@marrowdene.example', name: 'Corin Haspel', organisation: laboratory, roles: ['engineer'] },
  {
    mail: 'administrator@marrowdene.example',
    name: 'Ottoline Brask',
    organisation: laboratory,
    roles: ['administrator'],
  },
  { mail: 'lot-engineer@ostrevell.example', name: 'Radek Imber', organisation: maker, roles: ['engineer'] },
  { mail: 'quality-manager@ostrevell.example', name: 'Yevka Sorrel', organisation: maker, roles: ['requester'] },
  {
    mail: 'lines@pellgrove.example',
    name: 'Anselm Wyke',
    organisation: 'Pellgrove Line Company',
    roles: ['requester'],
  },
  {
    mail: 'studio@cindermoor.example',
    name: 'Livia Tarn',
    organisation: 'Cindermoor Dental Studio',
    roles: ['requester'],
  },
  { mail: 'toolroom@hexlund.example', name: 'Hobart Lunde', organisation: 'Hexlund Tooling', roles: ['requester'] },
  { mail: 'site@vantrisse.example', name: 'Mireille Ashdow', organisation: 'Vantrisse Glazing', roles: ['requester'] },
] as const satisfies readonly DemoPerson[];

export type DemoMail = (typeof demoPeople)[number]['mail'];

/** One password for all, since the demo is open to whoever starts it. */
export const demoPassword = 'hackle and mist';
