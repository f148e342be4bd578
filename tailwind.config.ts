import type { Config } from 'tailwindcss'

/** Colours are variables so that lamp mode can change them all at once (assets/css/main.css). */
const tone = (name: string) => `rgb(var(--${name}) / <alpha-value>)`

export default {
  content: ['./app.vue', './error.vue', './components/**/*.vue', './layouts/**/*.vue', './pages/**/*.vue', './utils/**/*.ts'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      paper: tone('paper'),
      sheet: tone('sheet'),
      ink: { DEFAULT: tone('ink'), soft: tone('ink-soft') },
      rule: tone('rule'),
      moss: { DEFAULT: tone('moss'), tint: tone('moss-tint'), on: tone('moss-on') },
      bar: { DEFAULT: tone('bar'), on: tone('bar-on') },
      food: { DEFAULT: tone('food'), fill: tone('food-fill'), tint: tone('food-tint') },
      water: { DEFAULT: tone('water'), fill: tone('water-fill'), tint: tone('water-tint') },
      dose: { DEFAULT: tone('dose'), fill: tone('dose-fill'), tint: tone('dose-tint') },
      stop: { DEFAULT: tone('stop'), tint: tone('stop-tint') },
    },
    fontFamily: { sans: ['"Source Sans 3"', 'system-ui', 'sans-serif'], mono: ['ui-monospace', 'monospace'] },
    borderRadius: { none: '0', DEFAULT: '3px' },
    boxShadow: { none: 'none' },
    extend: {
      fontSize: { amount: ['2.125rem', '1.1'], 'amount-lg': ['3.25rem', '1'] },
      screens: { print: { raw: 'print' } },
    },
  },
} satisfies Config
