import { definePreset } from '@primeuix/themes';
import Aura from '@primeuix/themes/aura';

/** A step of a component library's colour scale, told by our own variables: no colour is written here. */
const steps = (name: string) =>
  Object.fromEntries([50, 100, 200, 300, 400, 500, 600, 700, 800, 900, 950].map((step) => [step, `var(--${name})`]));

/** What lies over the page for a moment; the night scheme of the library would turn it inside out. */
const floating = { background: 'var(--sheet)', borderColor: 'var(--ink-soft)', color: 'var(--ink)' };

const scheme = {
  surface: {
    0: 'var(--sheet)',
    50: 'var(--ground)',
    100: 'var(--ground)',
    200: 'var(--hairline)',
    300: 'var(--hairline)',
    400: 'var(--ink-soft)',
    500: 'var(--ink-soft)',
    600: 'var(--ink-soft)',
    700: 'var(--ink)',
    800: 'var(--ink)',
    900: 'var(--ink)',
    950: 'var(--ink)',
  },
  primary: {
    color: 'var(--ink)',
    contrastColor: 'var(--ground)',
    hoverColor: 'var(--ink)',
    activeColor: 'var(--ink)',
  },
  highlight: {
    background: 'var(--released-ground)',
    focusBackground: 'var(--released-ground)',
    color: 'var(--released)',
    focusColor: 'var(--released)',
  },
  mask: { background: 'color-mix(in srgb, var(--ink) 60%, transparent)', color: 'var(--sheet)' },
  formField: {
    background: 'var(--sheet)',
    disabledBackground: 'var(--ground)',
    borderColor: 'var(--ink-soft)',
    hoverBorderColor: 'var(--ink)',
    focusBorderColor: 'var(--ink)',
    invalidBorderColor: 'var(--outside)',
    color: 'var(--ink)',
    placeholderColor: 'var(--ink-soft)',
    shadow: 'none',
  },
  text: {
    color: 'var(--ink)',
    hoverColor: 'var(--ink)',
    mutedColor: 'var(--ink-soft)',
    hoverMutedColor: 'var(--ink)',
  },
  content: {
    background: 'var(--sheet)',
    hoverBackground: 'var(--ground)',
    borderColor: 'var(--hairline)',
    color: 'var(--ink)',
    hoverColor: 'var(--ink)',
  },
  overlay: { select: floating, popover: floating, modal: floating },
  list: {
    option: {
      color: 'var(--ink)',
      focusBackground: 'var(--ground)',
      focusColor: 'var(--ink)',
      selectedBackground: 'var(--released-ground)',
      selectedFocusBackground: 'var(--released-ground)',
      selectedColor: 'var(--released)',
      selectedFocusColor: 'var(--released)',
    },
  },
};

/** The component library in the house's paper and ink; both schemes read the same variables, which the theme switches. */
export const headfastPreset = definePreset(Aura, {
  primitive: {
    borderRadius: { none: '0', xs: '2px', sm: '2px', md: '2px', lg: '2px', xl: '2px' },
  },
  semantic: {
    transitionDuration: 'var(--quick)',
    focusRing: { width: '3px', style: 'solid', color: 'var(--ink)', offset: '2px', shadow: 'none' },
    primary: steps('ink'),
    formField: { paddingX: '0.75rem', paddingY: '0.75rem', borderRadius: 'var(--corner)' },
    colorScheme: { light: scheme, dark: scheme },
  },
});
