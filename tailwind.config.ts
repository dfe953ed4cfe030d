import type { Config } from 'tailwindcss'

/** Tokens resolve through custom properties, so a theme (bright sun, night) changes values and no class name. */
const token = (name: string) => `var(--${name})`

const config: Config = {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}', './content/**/*.mdx', './mdx-components.tsx'],
  theme: {
    extend: {
      colors: {
        paper: token('paper'),
        card: token('card'),
        field: token('field'),
        ink: token('ink'),
        mute: token('mute'),
        rule: token('rule'),
        plate: token('plate'),
        chalk: token('chalk'),
        'chalk-dim': token('chalk-dim'),
        straw: token('straw'),
        bronze: token('bronze'),
        violet: token('violet'),
        blue: token('blue'),
        off: token('off'),
        tape: token('tape'),
        'signal-danger': token('signal-danger'),
        'signal-warning': token('signal-warning'),
        'signal-caution': token('signal-caution'),
        'signal-notice': token('signal-notice'),
      },
      fontFamily: {
        sans: ['var(--font-text)', 'sans-serif'],
        head: ['var(--font-head)', 'sans-serif'],
        // Primes are not in the mono's Latin set; the heading face has them.
        mono: ['var(--font-mono)', 'var(--font-head)', 'monospace'],
      },
      borderRadius: { plate: '4px' },
      maxWidth: { page: '1320px' },
    },
  },
}

export default config
