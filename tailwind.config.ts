import type { Config } from 'tailwindcss';

/**
 * Colours are named for what they mean and resolve to the theme's variables (app/globals.css).
 * Square corners everywhere: nothing on a drawing sheet is rounded. No size below 14 px.
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
        'rule-faint': 'var(--rule-faint)',
        spruce: 'var(--spruce)',
        'on-spruce': 'var(--on-spruce)',
        'spruce-wash': 'var(--spruce-wash)',
        action: 'var(--action)',
        'on-action': 'var(--on-action)',
        alarm: 'var(--alarm)',
        'on-alarm': 'var(--on-alarm)',
        'alarm-wash': 'var(--alarm-wash)',
        caution: 'var(--caution)',
        'caution-wash': 'var(--caution-wash)',
        focus: 'var(--focus)',
      },
      fontFamily: {
        sans: ['var(--font-sans)', 'ui-sans-serif', 'system-ui', 'sans-serif'],
      },
      fontSize: { xs: ['0.875rem', '1.25rem'] },
      borderRadius: { none: '0', DEFAULT: '0', sm: '0', md: '0', lg: '0' },
    },
  },
};

export default config;
