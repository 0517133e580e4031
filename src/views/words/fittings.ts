/** Names of the fittings that the tables of straight lengths know. S is the gap between two bends. */
import type { Choice } from './elements.ts';

/** Every fitting, in the order of the list. */
export const fittingChoices: readonly Choice[] = [
  { value: 'any', label: 'Any fitting' },
  { value: 'single-bend', label: 'One 90° bend' },
  { value: 'bend-45', label: 'One 45° bend, or two in one plane, S at least 2\u00a0D' },
  { value: 'bends-same-plane', label: 'Two or more 90° bends in one plane' },
  { value: 'bends-different-planes', label: 'Two or more 90° bends in different planes' },
  { value: 'bends-any-plane', label: 'Two or more 90° bends in any planes' },
  { value: 'two-bends-same-plane-far', label: 'Two 90° bends in one plane, S 10\u00a0D to 30\u00a0D' },
  { value: 'two-bends-same-plane-close', label: 'Two 90° bends in one plane, S up to 10\u00a0D' },
  { value: 'two-bends-perpendicular-far', label: 'Two 90° bends in perpendicular planes, S 5\u00a0D to 30\u00a0D' },
  { value: 'two-bends-perpendicular-close', label: 'Two 90° bends in perpendicular planes, S below 5\u00a0D' },
  { value: 'tee-or-mitre', label: '90° tee or mitre bend' },
  { value: 'reducer', label: 'Reducer, 2\u00a0D to D' },
  { value: 'expander', label: 'Expander, 0.5\u00a0D to D' },
  { value: 'reducer-slight', label: 'Reducer, 1.33\u00a0D to D' },
  { value: 'reducer-strong', label: 'Reducer, 3\u00a0D to D' },
  { value: 'expander-slight', label: 'Expander, 0.75\u00a0D to D' },
  { value: 'expander-strong', label: 'Expander, 0.67\u00a0D to D' },
  { value: 'abrupt-reduction', label: 'Abrupt reduction' },
  { value: 'full-bore-valve', label: 'Ball or gate valve, fully open' },
  { value: 'globe-valve', label: 'Globe valve, fully open' },
  { value: 'pocket-small', label: 'Thermometer pocket, up to 0.03\u00a0D' },
  { value: 'pocket-large', label: 'Thermometer pocket, 0.03\u00a0D to 0.13\u00a0D' },
  { value: 'downstream', label: 'Any fitting downstream' },
];

/** Name of a fitting; a code that is not in the list stands as it is written. */
export const fittingLabel = (code: string): string =>
  fittingChoices.find((choice) => choice.value === code)?.label ?? code;
