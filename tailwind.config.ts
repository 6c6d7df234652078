import type { Config } from 'tailwindcss'
import plugin from 'tailwindcss/plugin'
import { PALETTE, type ThemeName, type Token } from './shared/drawing/palette'

const tokens = Object.keys(PALETTE.light) as Token[]

const variablesOf = (theme: ThemeName): Record<string, string> => ({
  'color-scheme': theme,
  ...Object.fromEntries(tokens.map((token) => [`--${token}`, PALETTE[theme][token]])),
})

const colors = Object.fromEntries(tokens.map((token) => [token, `var(--${token})`]))

/**
 * The theme names the palette's variables, so that a class such as `bg-paper` follows the theme at
 * run time (there is no `dark:` variant to write). Sizes hang on two variables of the place, `--target` and `--body` (src/styles/places.css).
 */
export default {
  content: ['./index.html', './src/**/*.{ts,tsx}'],
  theme: {
    colors: { ...colors, transparent: 'transparent', current: 'currentColor' },
    fontFamily: {
      sans: ['"Atkinson Hyperlegible Next Variable"', 'system-ui', 'sans-serif'],
      figure: [
        '"JetBrains Mono", ui-monospace, monospace',
        { fontFeatureSettings: '"calt" 0, "tnum" 1' },
      ],
    },
    fontSize: {
      small: ['calc(var(--body) * 0.875)', '1.4'],
      body: ['var(--body)', '1.5'],
      lead: ['calc(var(--body) * 1.125)', '1.4'],
      title: ['calc(var(--body) * 1.375)', '1.25'],
      figure: ['calc(var(--body) * 1.75)', '1.1'],
      stand: ['clamp(4.5rem, 8vw, 6.5rem)', '1'],
    },
    extend: {
      spacing: { target: 'var(--target)' },
      borderRadius: { control: '0.25rem' },
    },
  },
  plugins: [
    plugin((api) => {
      api.addBase({
        ':root': variablesOf('light'),
        ':root[data-theme=dark]': variablesOf('dark'),
        '@media (prefers-color-scheme: dark)': {
          ':root[data-theme=system]': variablesOf('dark'),
        },
        '@media print': { ':root[data-theme]': variablesOf('light') },
      })
    }),
  ],
} satisfies Config
