import type { Config } from 'tailwindcss';

/** Colours by the names that the design gives them; their values stand in src/theme/tokens.css. */
const COLOURS = [
  'paper', 'paper-raised', 'paper-sunk', 'sheet',
  'ink', 'ink-2', 'ink-3', 'ink-on-dark',
  'hairline', 'rule', 'control',
  'clay', 'clay-deep', 'clay-wash', 'clay-line',
  'water', 'water-line', 'water-ink', 'park', 'park-ink', 'tree', 'road', 'road-edge', 'land', 'yard',
  'garden', 'bldg', 'bldg-edge', 'contour', 'trace',
  'select', 'select-wash', 'focus',
  'trig-green', 'trig-amber', 'trig-red', 'trig-green-wash', 'trig-amber-wash', 'trig-red-wash',
  'band', 'band-line',
]; // prettier-ignore

const config: Config = {
  content: ['./index.html', './src/**/*.{ts,tsx}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      ...Object.fromEntries(COLOURS.map((name) => [name, `var(--${name})`])),
    },
    fontFamily: { sans: 'var(--font)' },
    fontSize: {
      micro: '10px',
      cap: '11px',
      small: '12px',
      body: '13px',
      roomy: '14px',
      lead: '15px',
      h3: '16px',
      owner: '17px',
      h2: '20px',
      count: '22px',
      h1: '26px',
      figure: '30px',
    },
    fontWeight: { normal: '400', medium: '500', semibold: '600', bold: '700' },
    lineHeight: { none: '1', tight: '1.2', snug: '1.35', normal: '1.45', owner: '1.6' },
    borderRadius: { none: '0', DEFAULT: '2px', lg: '3px' },
    boxShadow: { none: 'none', lift: 'var(--lift)' },
    extend: {
      height: { row: 'var(--row)', bar: 'calc(var(--bar) - 1px)', basis: 'var(--basis)' },
      minHeight: { touch: 'var(--target-touch)' },
      minWidth: { touch: 'var(--target-touch)' },
    },
  },
};

export default config;
