import type { Config } from 'tailwindcss'

/**
 * Tailwind speaks the identity's tokens: every value is a CSS variable of renderer/styles/tokens.css, so that the day and the
 * night sheet need no second set of classes.
 */
export default {
  content: ['./pages/**/*.vue', './renderer/**/*.vue'],
  theme: {
    screens: { phone: { max: '760px' }, lap: { max: '900px' }, desk: '1181px' },
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      paper: 'var(--paper)',
      sheet: 'var(--sheet)',
      bench: 'var(--bench)',
      ruts: 'var(--ruts)',
      'rut-line': 'var(--rut-line)',
      ink: 'var(--ink)',
      rut: 'var(--rut)',
      clay: { DEFAULT: 'var(--clay)', fill: 'var(--clay-fill)', wash: 'var(--clay-wash)' },
      moss: { DEFAULT: 'var(--moss)', fill: 'var(--moss-fill)', wash: 'var(--moss-wash)' },
      tape: { DEFAULT: 'var(--tape)', fill: 'var(--tape-fill)', wash: 'var(--tape-wash)' },
      flag: { DEFAULT: 'var(--flag)', wash: 'var(--flag-wash)', ink: 'var(--flag-ink)' },
      band: 'var(--band)',
      'on-band': 'var(--on-band)',
      'on-ink': 'var(--on-ink)',
    },
    fontFamily: { read: 'var(--read)', ui: 'var(--ui)' },
    fontSize: {
      mark: 'var(--t-mark)',
      small: 'var(--t-small)',
      ui: 'var(--t-ui)',
      body: 'var(--t-body)',
      lead: 'var(--t-lead)',
      h3: 'var(--t-h3)',
      h2: 'var(--t-h2)',
      h1: 'var(--t-h1)',
      sign: 'var(--t-sign)',
    },
    spacing: {
      0: '0',
      px: '1px',
      1: 'var(--s1)',
      2: 'var(--s2)',
      3: 'var(--s3)',
      4: 'var(--s4)',
      5: 'var(--s5)',
      6: 'var(--s6)',
      7: 'var(--s7)',
      8: 'var(--s8)',
      9: 'var(--s9)',
      gutter: 'var(--gutter)',
      tap: 'var(--tap)',
    },
    borderRadius: { none: '0', DEFAULT: 'var(--r1)', ctl: 'var(--r2)' },
    maxWidth: { measure: 'var(--measure)', sheet: 'var(--sheet-max)', none: 'none', full: '100%' },
  },
} satisfies Config
