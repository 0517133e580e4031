/**
 * Relative pressure loss of a classical Venturi tube against the diameter ratio.
 * Source: ISO 5167-4:2003, Annex C (informative), read off its figure at second hand; values rounded to 0.001.
 * The rise at low Reynolds numbers is quoted with the same curves.
 */
import type { Source } from '../../quantity/source.ts';

export const venturiLoss = {
  ratios: [0.3, 0.35, 0.4, 0.45, 0.5, 0.55, 0.6, 0.65, 0.7, 0.75],
  small: [0.164, 0.162, 0.158, 0.152, 0.143, 0.134, 0.124, 0.113, 0.101, 0.088],
  large: [0.089, 0.087, 0.084, 0.08, 0.075, 0.068, 0.061, 0.054, 0.048, 0.04],
  smallBore: 0.065, // m
  largeBore: 0.5, // m
  raise: 1.75,
  low: 1e5, // Re_D
  high: 6e5, // Re_D
  source: { clause: 'ISO 5167-4:2003, Annex C', seen: 'second-hand' } satisfies Source,
} as const;
