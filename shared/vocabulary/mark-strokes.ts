/** The end or vertex glyph of a mark's stroke, so that marks tell apart in grey print. */
export type StrokeEnd = 'ring' | 'squares' | 'bars' | 'arrow' | 'circles' | 'triangle' | 'disc' | 'none';
