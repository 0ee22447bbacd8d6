import type { Config } from 'tailwindcss';

/** The palette and type of the product. Colours are CSS variables (src/styles/tokens.css), so that light and dark are one class list. */
export default {
  content: ['./index.html', './src/**/*.{ts,tsx}'],
  darkMode: ['selector', '[data-theme="dark"]'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      paper: 'var(--paper)',
      ink: 'var(--ink)',
      deep: 'var(--deep)',
      shallow: 'var(--shallow)',
      wash: 'var(--wash)',
      hairline: 'var(--hairline)',
      stone: 'var(--stone)',
      reed: 'var(--reed)',
      kingfisher: 'var(--kingfisher)',
      brass: 'var(--brass)',
    },
    fontFamily: {
      mono: ['"JetBrains Mono"', 'ui-monospace', 'monospace'],
      sans: ['"JetBrains Mono"', 'ui-monospace', 'monospace'],
    },
    fontSize: {
      small: ['0.75rem', { lineHeight: '1.25rem' }],
      base: ['0.8125rem', { lineHeight: '1.25rem' }],
      large: ['1.25rem', { lineHeight: '1.75rem' }],
      figure: ['2rem', { lineHeight: '2.5rem' }],
    },
    extend: {},
  },
} satisfies Config;
