/** Words of house style: the states of a version, who may do what with it, and the choices it is made of. */

export const STYLE_STATES = ['draft', 'proposed', 'in-force', 'replaced', 'withdrawn'] as const;
export type StyleState = (typeof STYLE_STATES)[number];
export const STYLE_STATE_NAMES: Record<StyleState, string> = {
  draft: 'Draft',
  proposed: 'Proposed',
  'in-force': 'In force',
  replaced: 'Replaced',
  withdrawn: 'Withdrawn',
};

export const STYLE_ORIGINS = ['desk', 'product'] as const;
export type StyleOrigin = (typeof STYLE_ORIGINS)[number];

export const STYLE_ACTS = ['proposed', 'put-in-force', 'sent-back', 'withdrawn'] as const;
export type StyleAct = (typeof STYLE_ACTS)[number];
