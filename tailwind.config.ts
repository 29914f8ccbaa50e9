import type { Config } from 'tailwindcss';

// Every colour is a custom property of src/theme/tokens.css, so that both themes share one set of class names.
// prettier-ignore
const colours = [
  'ground', 'sheet', 'well', 'hairline', 'rule', 'control', 'ink', 'ink-2', 'ink-3',
  'celadon', 'celadon-wash', 'cobalt', 'cobalt-wash', 'iron', 'iron-wash', 'ochre', 'ochre-wash', 'on-strong',
  'plate', 'on-plate', 'on-plate-2',
  'o-pore', 'o-agg', 'o-inc', 'o-mach', 'o-chip', 'o-cont', 'o-grain', 'o-pit',
  'm-origin', 'm-flaw', 'm-mirror', 'm-mist', 'm-hackle', 'm-wallner', 'm-arrest', 'm-curl', 'm-halo',
] as const;

export default {
  content: ['./index.html', './src/**/*.{ts,tsx}'],
  theme: {
    extend: {
      colors: Object.fromEntries(colours.map((name) => [name, `var(--${name})`])),
      fontFamily: { serif: 'var(--serif)', sans: 'var(--sans)', mono: 'var(--mono)' },
      fontSize: {
        xs: ['12.5px', '1.35'],
        s: ['13.5px', '1.42'],
        m: ['15px', '1.45'],
        base: ['16px', '1.5'],
        prose: ['17px', '1.56'],
        h4: ['19.2px', '1.2'],
        h3: ['23px', '1.2'],
        h2: ['27.6px', '1.2'],
        h1: ['33.2px', '1.2'],
      },
      spacing: { edge: 'var(--edge)', 'page-x': 'var(--page-x)' },
      borderRadius: { DEFAULT: '2px' },
    },
  },
} satisfies Config;
