import { existsSync } from 'node:fs';
import { installDebianPackages } from '../../server/bin/debian.mjs';

const TOOLS = [
  { file: '/usr/bin/chromium', name: 'chromium' },
  { file: '/usr/bin/pdftotext', name: 'poppler-utils' },
  { file: '/usr/share/fonts/truetype/dejavu/DejaVuSans.ttf', name: 'fonts-dejavu-core' },
];

/** Installs what the browser tests and the tests of printed reports need, when it is missing. */
export async function ensureTools({ signal, say }) {
  const names = TOOLS.filter(({ file }) => !existsSync(file)).map(({ name }) => name);
  if (names.length === 0) return;
  await installDebianPackages({ what: 'A program the browser tests need', names, signal, say });
}
