import type { CheckInput } from './types';

/** Directions the wind may come from while the layout stands, clockwise from `from_deg`. */
export type WindArc = { readonly from_deg: number; readonly to_deg: number };

export function standsFor(_input: CheckInput): WindArc | null {
  return null;
}
