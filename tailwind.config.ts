import type { Config } from 'tailwindcss';

// Every colour is a custom property of src/theme/tokens.css, so that both themes share one set of class names.
const colours = [
  'ground', 'sheet', 'well', 'hairline', 'rule', 'control', 'ink', 'ink-2', 'ink-3',
  'celadon', 'celadon-wash', 'cobalt', 'cobalt-wash', 'iron', 'iron-wash', 'ochre', 'ochre-wash', 'on-strong',
] as const;

export default {
  content: ['./index.html', './src/**/*.{ts,tsx}'],
  theme: {
    extend: {
      colors: Object.fromEntries(colours.map((name) => [name, `var(--${name})`])),
      fontFamily: { serif: 'var(--serif)', sans: 'var(--sans)', mono: 'var(--mono)' },
      borderRadius: { DEFAULT: '2px' },
    },
  },
} satisfies Config;
