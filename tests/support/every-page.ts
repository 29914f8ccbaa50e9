export type Reader = 'visitor' | 'analyst' | 'second reader' | 'manager' | 'administrator' | 'engineer' | 'requester';

/** Whose eyes a page is looked at with, in the demo. */
export const readerMails: Record<Exclude<Reader, 'visitor'>, string> = {
  analyst: 'analyst-oxide@marrowdene.example',
  'second reader': 'second-reader@marrowdene.example',
  manager: 'laboratory-manager@marrowdene.example',
  administrator: 'administrator@marrowdene.example',
  engineer: 'lot-engineer-2@marrowdene.example',
  requester: 'quality-manager@ostrevell.example',
};

export type PageLooked = {
  name: string;
  reader: Reader;
  path: string;
  /** What it asks for is not there for this reader. */
  isMissing?: true;
};

const chaptersOf = (code: string, reader: Reader, chapters: readonly string[]): PageLooked[] =>
  chapters.map((chapter) => ({
    name: `${code}-${chapter}`,
    reader,
    path: `/cases/HB-2026-${code}/${chapter}`,
  }));

const all = ['intake', 'evidence', 'fractographs', 'estimates', 'findings', 'review'];

/** Every place of the book, as the role that uses it. `:bench` and `:material` stand for ids known only when it runs. */
export const everyPage: readonly PageLooked[] = [
  { name: 'sign-in', reader: 'visitor', path: '/sign-in' },
  { name: 'password', reader: 'visitor', path: '/password' },
  { name: 'casebook', reader: 'analyst', path: '/' },
  { name: 'casebook-nothing-fits', reader: 'analyst', path: '/?words=nothing+of+the+kind' },
  { name: 'casebook-manager', reader: 'manager', path: '/?year=any' },
  { name: 'my-requests', reader: 'requester', path: '/' },
  { name: 'casebook-administrator', reader: 'administrator', path: '/' },
  { name: 'open-a-case', reader: 'analyst', path: '/cases/new' },
  ...chaptersOf('0004', 'analyst', all),
  ...chaptersOf('0005', 'second reader', all),
  ...chaptersOf('0007', 'manager', ['intake', 'evidence', 'estimates', 'review']),
  ...chaptersOf('0001', 'analyst', all),
  ...chaptersOf('0011', 'engineer', ['intake', 'fractographs', 'estimates', 'review']),
  { name: '0004-bench', reader: 'analyst', path: '/cases/HB-2026-0004/fractographs/:bench' },
  { name: 'followed-closed', reader: 'requester', path: '/cases/HB-2026-0001' },
  { name: 'followed-open', reader: 'requester', path: '/cases/HB-2026-0004' },
  { name: 'materials', reader: 'engineer', path: '/materials' },
  { name: 'material', reader: 'engineer', path: '/materials/:material' },
  { name: 'people', reader: 'administrator', path: '/laboratory/people' },
  { name: 'instruments', reader: 'analyst', path: '/laboratory/instruments' },
  { name: 'instruments-administrator', reader: 'administrator', path: '/laboratory/instruments' },
  { name: 'mail', reader: 'administrator', path: '/laboratory/mail' },
  { name: 'trail', reader: 'administrator', path: '/laboratory/trail' },
  { name: 'me', reader: 'analyst', path: '/me' },
  { name: 'nothing-here', reader: 'analyst', path: '/no-such-place' },
  { name: 'no-such-case', reader: 'requester', path: '/cases/HB-2026-0009', isMissing: true },
];
