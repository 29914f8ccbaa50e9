// What kind of irregularity a part broke from, as it is written.
import { requireThat } from '../require.ts';

export type OriginRelation = 'single' | 'uncertain' | 'primary-secondary' | 'either' | 'linked';
export type OriginRead = {
  readonly relation: OriginRelation;
  /** The codes without their question marks, as written: P^V, MD^S, I_Fe. */
  readonly parts: readonly string[];
  /** Those of the parts that are probable, not certain. */
  readonly uncertainParts: readonly string[];
};

const joints = { '&': 'primary-secondary', '/': 'either', '+': 'linked' } as const;
const item = /^([A-Za-z]+(?:_[A-Za-z0-9]+)?(?:\^[VS])?)(\?)?$/;
// unidentified, and not examined: alone only
const words = ['?', '–'];

/**
 * Reads an origin's code, one flaw or several that are joined. Method `originCode.parse`.
 *
 * X&Y is X first and Y second, X/Y one of the two, X+Y two linked into one, X? probable. Spaces about the joints are passed
 * over. Any letters may stand for a kind, so that a laboratory's own are read too.
 * Source: code := item { joint item }, item := letters [_element] [^V or ^S] [?], one kind of joint; joints after ASTM C1322.
 * @throws OutsideDomain unreadable-code
 * @example parseOriginCode('P^V&LG^V') // { relation: 'primary-secondary', parts: ['P^V', 'LG^V'], uncertainParts: [] }
 */
export function parseOriginCode(code: string): OriginRead {
  const written = code.trim();
  if (words.includes(written)) return { relation: 'single', parts: [written], uncertainParts: [] };
  const joined = Object.entries(joints).filter(([joint]) => written.includes(joint));
  requireThat(joined.length <= 1, 'unreadable-code', 'code');
  const [joint, together] = joined[0] ?? [];
  const read = (joint === undefined ? [written] : written.split(joint)).map(readItem);
  const uncertainParts = read.filter((each) => each.uncertain).map((each) => each.part);
  return {
    relation: together ?? (uncertainParts.length > 0 ? 'uncertain' : 'single'),
    parts: read.map((each) => each.part),
    uncertainParts,
  };
}

function readItem(text: string): { part: string; uncertain: boolean } {
  const [, part, mark] = item.exec(text.trim()) ?? [];
  requireThat(part !== undefined, 'unreadable-code', 'code');
  return { part, uncertain: mark !== undefined };
}
