/** Care owed to the pieces of a case and to who handles them; `of` says in which cases beside those always shown. */
export const cautionsAtReceipt = [
  {
    lead: 'Before you touch.',
    words:
      'Broken edges cut through thin gloves. Tweezers, cut-resistant gloves, eye protection. Never feel for the origin with a finger.',
    of: null,
  },
  {
    lead: 'Before you open, cut or blow it,',
    words:
      'ask what it is: beryllium oxide, lead-bearing ceramics, thoria, fibre insulation and unknown coatings need their own rules.',
    of: null,
  },
  {
    lead: 'Tempered, cracked or bent glass',
    words: 'stores energy and may let go without warning. Film or box it, shield, keep others back.',
    of: /glass|temper|panel/i,
  },
  {
    lead: 'Vessels, sight glasses, lamps, vacuum:',
    words: 'release pressure or vacuum, isolate and lock before removal. A surviving twin may fail the same way.',
    of: /vessel|sight glass|lamp|vacuum/i,
  },
  {
    lead: 'Insulators, electrical parts:',
    words: 'only authorised people near equipment that may be live or charged.',
    of: /insulator|porcelain|electric|line|post/i,
  },
  {
    lead: 'Hardmetal:',
    words: 'cobalt-bearing dust can cause asthma and lasting lung disease. Extraction and fitted respirator.',
    of: /hardmetal|carbide|punch|insert/i,
  },
  {
    lead: 'Body-worn or oral parts:',
    words: 'treat as infectious until disinfected; log it, since disinfection can change the face. No patient names.',
    of: /crown|bridge|dental|molar|hip|zirconia/i,
  },
] as const;

/** The cautions a case's own words call for, those for every case first. */
export function cautionsFor(words: string) {
  return cautionsAtReceipt.filter(({ of }) => of === null || of.test(words));
}
