import { describe, expect, it } from 'vitest';
import { emptyDraft, methodsOf, wantedFrom, type EstimateDraft } from './draft.ts';
import { previewDraft } from './preview.ts';

const nothingOffered = { measurements: [], constants: [] };
const method = methodsOf('load').find((each) => each.id === 'bend4.rect') ?? methodsOf('load')[0];

/** A draft of a four-point bar with these typings of value and ±. */
function aDraft(typings: Record<string, [string, string]>): EstimateDraft {
  const draft = emptyDraft('load');
  for (const [name, [text, uncertaintyText]] of Object.entries(typings)) {
    const entered = draft.inputs[name];
    if (entered) draft.inputs[name] = { ...entered, from: 'typed', text, uncertaintyText };
  }
  return { ...draft, method: 'bend4.rect' };
}
const bar: Record<string, [string, string]> = {
  load: ['421 N', '1.73 %'],
  outerSpan: ['40 mm', '0.1'],
  innerSpan: ['20 mm', '0.1'],
  width: ['4.01 mm', '0.01'],
  depth: ['3.00 mm', '0.01'],
};
const previewed = (typings: Record<string, [string, string]>) => {
  if (!method) throw new Error('no method for a bar');
  return previewDraft(method, aDraft(typings), nothingOffered);
};

describe('an estimate while it is filled in', () => {
  it('shows the stress that will be kept', () => {
    expect(previewed(bar).reckoned?.origin.value).toBeCloseTo(349.96, 2);
  });

  it('says what is still wanted', () => {
    expect(previewed({ load: ['421 N', '2 %'] }).hindrance).toBe('Still wanted: outer span, inner span, width, depth.');
  });

  it('says what a typing in another unit reads, before its ± is there', () => {
    const { depth } = previewed({ ...bar, depth: ['0.118 in', ''] }).inputs;
    expect(depth).toMatchObject({ kind: 'wrong', part: 'uncertainty' });
    expect(depth?.kind === 'wrong' && depth.echo?.replace('\u00a0', ' ')).toBe('0.118 in reads 2.997 mm');
  });

  it('gives the refusal of the method in words', () => {
    expect(previewed({ ...bar, innerSpan: ['40 mm', '0.1'] }).hindrance).toBe(
      'Inner span must be less than the outer span.',
    );
  });

  it('keeps what was typed when the method is changed, and sends only what the method takes', () => {
    const local = methodsOf('load').find((each) => each.id === 'bend4.rect.local');
    if (!local) throw new Error('no method at the origin');
    const draft = aDraft({ ...bar, y: ['300 µm', '12.5'] });
    expect(Object.keys(wantedFrom(local, draft, null).inputs)).toContain('y');
    if (method) expect(Object.keys(wantedFrom(method, draft, null).inputs)).toEqual(Object.keys(bar));
  });
});
