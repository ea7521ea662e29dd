import type { Config } from 'tailwindcss'

/*
 * Every colour is a CSS variable of app/globals.css. The default palette is left out on purpose:
 * an interface colour that is not a token would bias the judgement of a shade.
 */
export default {
  content: [],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      paper: 'var(--paper)',
      sheet: 'var(--sheet)',
      wash: 'var(--wash)',
      hairline: 'var(--hairline)',
      rule: 'var(--rule)',
      ink: { DEFAULT: 'var(--ink)', soft: 'var(--ink-soft)', faint: 'var(--ink-faint)' },
      woad: { DEFAULT: 'var(--woad)', deep: 'var(--woad-deep)' },
      'on-woad': 'var(--on-woad)',
      ground: 'var(--ground)',
    },
    fontFamily: {
      title: ['var(--font-besley-ext)', 'var(--font-besley)', 'Georgia', 'serif'],
      body: ['var(--font-hanken-ext)', 'var(--font-hanken)', 'system-ui', 'sans-serif'],
    },
    fontSize: {
      xs: ['0.75rem', '1rem'],
      sm: ['0.8125rem', '1.125rem'],
      base: ['0.9375rem', '1.375rem'],
      lg: ['1.0625rem', '1.5rem'],
      xl: ['1.25rem', '1.75rem'],
      '2xl': ['1.625rem', '2rem'],
      '3xl': ['2.125rem', '2.5rem'],
    },
    borderRadius: { none: '0', DEFAULT: '2px', full: '9999px' },
    boxShadow: { none: 'none', dragged: '0 6px 18px rgb(0 0 0 / 0.22)' },
    screens: { sm: '30rem', md: '45rem', margins: '56.25rem', lg: '72rem' },
    extend: {
      maxWidth: { measure: '64ch' },
      keyframes: {
        'wind-on': {
          from: { clipPath: 'inset(0 -8% 100% -8%)' },
          to: { clipPath: 'inset(0 -8% 0 -8%)' },
        },
        appear: { from: { opacity: '0' }, to: { opacity: '1' } },
      },
      animation: {
        'wind-on': 'wind-on 360ms steps(24, end) both',
        appear: 'appear 120ms ease-out',
      },
    },
  },
} satisfies Config
