import type { PartView } from '#shared/contracts/evidence.ts';

export type CautionText = { readonly lead: string; readonly text: string };

const edges: CautionText = {
  lead: 'Broken edges cut through thin gloves.',
  text: 'Tweezers, cut-resistant gloves, eye protection. Never feel for the origin with a finger.',
};
const unknown: CautionText = {
  lead: 'Ask what it is before you open, cut or blow it.',
  text: 'Beryllium oxide, lead-bearing ceramics, thoria, fibre insulation and unknown coatings need their own rules.',
};
const storedEnergy: CautionText = {
  lead: 'Tempered, cracked or bent glass stores energy',
  text: 'and may let go without warning. Film or box it, shield, keep others back.',
};
const cobaltDust: CautionText = {
  lead: 'Cobalt-bearing dust can cause asthma and lasting lung disease.',
  text: 'Extraction and fitted respirator.',
};
const bodyWorn: CautionText = {
  lead: 'Treat body-worn and oral parts as infectious until disinfected;',
  text: 'log it, since disinfection can change the face. No patient names.',
};
const pressure: CautionText = {
  lead: 'Release pressure or vacuum, isolate and lock before removal.',
  text: 'A surviving twin may fail the same way.',
};
const live: CautionText = {
  lead: 'Only authorised people near equipment that may be live or charged.',
  text: '',
};

/** For what is cut, ground or swept: shown where a cut, a section or powder is received. */
export const fineDust: CautionText = {
  lead: 'Fine dust harms lungs for good.',
  text: 'Wet or with extraction; no dry sweeping, no air gun. Your local limit governs.',
};

const bodyWords = /\b(oral|dental|tooth|teeth|crown|bridge|implant|saliva|body|bone|hip)\b/i;
const pressureWords = /\b(vessel|sight glass|lamp|vacuum|pressure|autoclave)\b/i;
const liveWords = /\b(insulator|bushing|electric\w*|substation|kV)\b/i;

/** The cautions that belong to receiving and handling the pieces of these parts, the general ones first. */
export function cautionsFor(parts: readonly PartView[]): CautionText[] {
  const says = (words: RegExp) => parts.some((part) => words.test(`${part.description} ${part.environment ?? ''}`));
  const isOf = (family: string) => parts.some((part) => part.material?.family === family);
  return [
    edges,
    unknown,
    ...(isOf('glass, tempered') ? [storedEnergy] : []),
    ...(isOf('hardmetal') ? [cobaltDust] : []),
    ...(says(bodyWords) ? [bodyWorn] : []),
    ...(says(pressureWords) ? [pressure] : []),
    ...(says(liveWords) ? [live] : []),
  ];
}
