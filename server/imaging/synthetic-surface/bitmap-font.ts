/** Rows of 5 dots, upper row first; # is a dot. Only what a scale bar says. */
const GLYPHS: Record<string, readonly string[]> = {
  '0': [' ### ', '#   #', '#  ##', '# # #', '##  #', '#   #', ' ### ', '     ', '     '],
  '1': ['  #  ', ' ##  ', '  #  ', '  #  ', '  #  ', '  #  ', ' ### ', '     ', '     '],
  '2': [' ### ', '#   #', '    #', '  ## ', ' #   ', '#    ', '#####', '     ', '     '],
  '3': [' ### ', '#   #', '    #', '  ## ', '    #', '#   #', ' ### ', '     ', '     '],
  '4': ['   # ', '  ## ', ' # # ', '#  # ', '#####', '   # ', '   # ', '     ', '     '],
  '5': ['#####', '#    ', '#### ', '    #', '    #', '#   #', ' ### ', '     ', '     '],
  '6': [' ### ', '#    ', '#    ', '#### ', '#   #', '#   #', ' ### ', '     ', '     '],
  '7': ['#####', '    #', '   # ', '   # ', '  #  ', '  #  ', '  #  ', '     ', '     '],
  '8': [' ### ', '#   #', '#   #', ' ### ', '#   #', '#   #', ' ### ', '     ', '     '],
  '9': [' ### ', '#   #', '#   #', ' ####', '    #', '    #', ' ### ', '     ', '     '],
  '.': ['     ', '     ', '     ', '     ', '     ', ' ##  ', ' ##  ', '     ', '     '],
  µ: ['     ', '     ', '#   #', '#   #', '#   #', '#  ##', '### #', '#    ', '#    '],
  m: ['     ', '     ', '## # ', '# # #', '# # #', '# # #', '# # #', '     ', '     '],
  ' ': ['     ', '     ', '     ', '     ', '     ', '     ', '     ', '     ', '     '],
};

export const GLYPH_ROWS = 9;
const ADVANCE = 6;

/** Width of a text in dots. */
export const textDots = (text: string) => text.length * ADVANCE - 1;

/** Whether the dot at column, row of a text is set; signs the font lacks are blank. */
export function isDotSet(text: string, column: number, row: number): boolean {
  const sign = text[Math.floor(column / ADVANCE)];
  return sign !== undefined && GLYPHS[sign]?.[row]?.[column % ADVANCE] === '#';
}
