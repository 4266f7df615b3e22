import { definePreset } from '@primevue/themes'
import base from '@primevue/themes/aura/base'
import dialog from '@primevue/themes/aura/dialog'
import drawer from '@primevue/themes/aura/drawer'

/** A scale of eleven shades between a wash and the deep shade, all of them words and grounds of tokens.css. */
function shades(wash: string, colour: string, deep: string) {
  const mixed = (part: number) => `color-mix(in srgb, ${colour} ${part}%, ${wash})`
  return {
    50: wash,
    100: mixed(12),
    200: mixed(25),
    300: mixed(50),
    400: mixed(75),
    500: colour,
    600: deep,
    700: deep,
    800: deep,
    900: deep,
    950: deep,
  }
}

const brick = shades('var(--brick-wash)', 'var(--brick)', 'var(--brick-deep)')
const lichen = shades('var(--lichen-wash)', 'var(--lichen)', 'var(--lichen)')
const ochre = shades('var(--ochre-wash)', 'var(--ochre-words)', 'var(--ochre-words)')
const oxblood = shades('var(--oxblood-wash)', 'var(--oxblood)', 'var(--oxblood)')
const slate = shades('var(--sunk)', 'var(--muted)', 'var(--ink)')

const surface = {
  0: 'var(--surface)',
  50: 'var(--sunk)',
  100: 'var(--sunk)',
  200: 'var(--line)',
  300: 'var(--edge)',
  400: 'var(--muted)',
  500: 'var(--muted)',
  600: 'var(--ink)',
  700: 'var(--ink)',
  800: 'var(--ink)',
  900: 'var(--ink)',
  950: 'var(--ink)',
}

/** The tokens of the components that are used: those of all of them would be the larger part of a page. A component that is taken into use is added here. */
const usedPart = { ...base, components: { dialog, drawer } }

/**
 * PrimeVue in the app's tokens. They flip with the theme by themselves, so there is one scheme here and not two,
 * and the selector for a dark one is switched off where the theme is installed.
 */
export const primeTheme = definePreset<Record<string, unknown>>(usedPart, {
  primitive: {
    borderRadius: { none: '0', xs: '2px', sm: '3px', md: '4px', lg: '4px', xl: '4px' },
    emerald: brick,
    green: lichen,
    red: oxblood,
    orange: ochre,
    yellow: ochre,
    amber: ochre,
    blue: slate,
    sky: slate,
    slate,
  },
  semantic: {
    transitionDuration: 'var(--quick)',
    focusRing: { width: '2px', style: 'solid', color: 'var(--focus)', offset: '2px', shadow: 'none' },
    primary: brick,
    formField: {
      paddingX: '0.625rem',
      paddingY: '0.4375rem',
      focusRing: { width: '2px', style: 'solid', color: 'var(--focus)', offset: '1px', shadow: 'none' },
    },
    mask: { transitionDuration: 'var(--quick)' },
    overlay: {
      select: { shadow: '0 2px 8px rgb(0 0 0 / 18%)' },
      popover: { shadow: '0 2px 8px rgb(0 0 0 / 18%)' },
      modal: { shadow: '0 4px 24px rgb(0 0 0 / 25%)' },
      navigation: { shadow: '0 2px 8px rgb(0 0 0 / 18%)' },
    },
    colorScheme: {
      light: {
        surface,
        primary: {
          color: 'var(--brick)',
          contrastColor: 'var(--on-brick)',
          hoverColor: 'var(--brick-deep)',
          activeColor: 'var(--brick-deep)',
        },
        highlight: {
          background: 'var(--brick-wash)',
          focusBackground: 'var(--brick-wash)',
          color: 'var(--ink)',
          focusColor: 'var(--ink)',
        },
        mask: { background: 'var(--veil)', color: 'var(--ink)' },
        formField: {
          borderColor: 'var(--edge)',
          hoverBorderColor: 'var(--ink)',
          focusBorderColor: 'var(--ink)',
          invalidBorderColor: 'var(--oxblood)',
          invalidPlaceholderColor: 'var(--oxblood)',
          iconColor: 'var(--muted)',
          shadow: 'none',
        },
      },
    },
  },
})
