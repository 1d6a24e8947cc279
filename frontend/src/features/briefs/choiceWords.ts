/** What the choices of a brief are called on screen. */
export const DIRECTION_WORDS = {
  any: 'Either way',
  same: 'Same way as the input',
  opposite: 'Against the input',
} as const;

export const OBJECTIVE_WORDS = {
  'centre-distance': 'Centre-distance sum',
  'ratio-error': 'Ratio error',
  mass: 'Mass',
} as const;

export const BEST_OF_WORDS = { 'each-count': 'Of each stage count', all: 'Of all counts together' } as const;

export const SHIFT_WORDS = { none: 'None', 'clear-undercut': 'Clear undercut' } as const;

export const UNDERCUT_WORDS = { allow: 'Allowed', refuse: 'Refused' } as const;
