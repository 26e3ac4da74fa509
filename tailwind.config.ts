import type { Config } from 'tailwindcss'

const token = (name: string) => `var(--${name})`
const tokens = ['sky', 'paper', 'night', 'ink', 'ink2', 'ink3', 'hair', 'hair2', 'rain', 'seed', 'seed-text', 'sprout', 'sprout-text', 'brick', 'brick-text', 'soil', 'stone']

/** Utilities speak the look's own words: its colours, its steps of space. The preflight is ours, in page.css. */
export default {
  content: ['./app/**/*.{vue,ts}'],
  corePlugins: { preflight: false },
  theme: {
    colors: Object.fromEntries(tokens.map(name => [name, token(name)])),
    spacing: { 0: '0', 1: '4px', 2: '8px', 3: '12px', 4: '16px', 6: '24px', 12: '48px' },
    screens: { middle: '720px', desk: '1200px' },
  },
} satisfies Config
