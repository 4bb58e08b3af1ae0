/** The work materials the rules know, in the order a list shows them. */
export const MATERIALS = [
  'plain-carbon-annealed',
  'plain-carbon-hardened',
  'alloy-annealed',
  'alloy-hardened',
  'tool-annealed',
  'tool-hardened',
  'cast-iron',
  'stainless',
  'copper-alloy',
  'aluminium-alloy',
] as const;

export type Material = (typeof MATERIALS)[number];
