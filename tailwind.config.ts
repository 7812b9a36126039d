import type { Config } from 'tailwindcss';

/**
 * Colours are named for what they mean and resolve to the theme's variables (app/globals.css).
 * Square corners everywhere: nothing on a drawing sheet is rounded.
 */
const config: Config = {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    extend: {
      colors: {
        paper: 'var(--paper)',
        margin: 'var(--margin)',
        ink: 'var(--ink)',
        'ink-soft': 'var(--ink-soft)',
        rule: 'var(--rule)',
        spruce: 'var(--spruce)',
        'on-spruce': 'var(--on-spruce)',
        alarm: 'var(--alarm)',
        'on-alarm': 'var(--on-alarm)',
        caution: 'var(--caution)',
      },
      fontFamily: {
        sans: ['var(--font-sans)', 'ui-sans-serif', 'system-ui', 'sans-serif'],
      },
      borderRadius: { none: '0', DEFAULT: '0', sm: '0', md: '0', lg: '0' },
    },
  },
};

export default config;
