import type { Config } from 'tailwindcss';

/** Each token is a CSS variable, so that dark is the same name with another value (app/globals.css). */
const token = (name: string) => `var(--${name})`;

const config: Config = {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  darkMode: 'media',
  theme: {
    extend: {
      colors: {
        cotton: token('cotton'),
        card: token('card'),
        linen: token('linen'),
        hem: token('hem'),
        thread: token('thread'),
        ink: token('ink'),
        'on-ink': token('on-ink'),
        dusk: token('dusk'),
        damson: { DEFAULT: token('damson'), deep: token('damson-deep'), wash: token('damson-wash') },
        stop: { DEFAULT: token('stop'), wash: token('stop-wash') },
        care: { DEFAULT: token('care'), wash: token('care-wash') },
        note: { DEFAULT: token('note'), wash: token('note-wash') },
        set: { DEFAULT: token('set'), wash: token('set-wash') },
      },
      borderRadius: { control: '6px', card: '10px' },
      fontFamily: {
        sans: ['var(--font-archivo)', 'ui-sans-serif', 'system-ui', 'sans-serif'],
        jersey: ['var(--font-saira)', 'var(--font-archivo)', 'sans-serif'],
        mono: ['var(--font-spline-mono)', 'ui-monospace', 'monospace'],
      },
    },
  },
};

export default config;
