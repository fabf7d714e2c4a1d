import type { Config } from 'tailwindcss'

const token = (name: string): string => `var(--${name})`

export default {
  content: ['./index.html', './src/**/*.{ts,tsx}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      paper: token('paper'),
      card: token('card'),
      rule: token('rule'),
      ink: token('ink'),
      soft: token('ink-soft'),
      spruce: token('spruce'),
      'on-spruce': token('on-spruce'),
      steel: token('steel'),
      marker: token('marker'),
      'marker-ground': token('marker-ground'),
      stop: token('stop'),
      'stop-ground': token('stop-ground'),
      'on-stop': token('on-stop'),
      chalk: token('chalk'),
      'chalk-ground': token('chalk-ground'),
      shade: token('shade'),
    },
    fontFamily: {
      text: ['Barlow', 'system-ui', 'sans-serif'],
      condensed: ['Barlow Semi Condensed', 'Barlow', 'system-ui', 'sans-serif'],
    },
    fontSize: {
      xs: ['12px', '16px'],
      sm: ['14px', '20px'],
      base: ['16px', '24px'],
      lg: ['20px', '28px'],
      xl: ['26px', '32px'],
      '2xl': ['34px', '40px'],
      '3xl': ['44px', '48px'],
    },
    fontWeight: { normal: '400', medium: '500', semibold: '600' },
    borderRadius: { none: '0', DEFAULT: '6px', full: '9999px' },
    boxShadow: { none: 'none', float: `0 4px 20px ${token('float')}` },
  },
} satisfies Config
