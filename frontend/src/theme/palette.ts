/**
 * The two palettes. The light one is the product's paper, ink and bottle green; the dark one is drawn anew for a dim
 * workshop rather than inverted: the paper is darker than the sheets on it, inks are warm, accents are lifted until
 * every text pair reaches 4.5 : 1 (checked in palette.test.ts).
 */
export interface Colours {
  /** Behind everything. */
  paper: string;
  /** Tables, forms and drawings lie on this. */
  sheet: string;
  /** Menus and dialogs. */
  raised: string;
  ink: string;
  /** Secondary text. */
  pencil: string;
  /** Hairlines between rows. */
  rule: string;
  /** The line under a table's head, a field's border. */
  ruleStrong: string;
  green: string;
  onGreen: string;
  greenDeep: string;
  brass: string;
  rust: string;
  plum: string;
  slate: string;
  /** The selected row. */
  brassWash: string;
  /** A row under the pointer, the current place in the navigation. */
  hoverWash: string;
  rustWash: string;
  plumWash: string;
  greenWash: string;
  /** Gear bodies in drawings: driver and driven. */
  pinionFill: string;
  wheelFill: string;
}

export const light: Colours = {
  paper: '#F6F4EE',
  sheet: '#FFFFFF',
  raised: '#FFFFFF',
  ink: '#20282B',
  pencil: '#566266',
  rule: '#E2DFD5',
  ruleStrong: '#8C9391',
  green: '#0F4C43',
  onGreen: '#FFFFFF',
  greenDeep: '#0A3831',
  brass: '#86590B',
  rust: '#A93A1E',
  plum: '#5A4A86',
  slate: '#4A6572',
  brassWash: '#FAF4E4',
  hoverWash: '#EFECE1',
  rustWash: '#FBEDE8',
  plumWash: '#F1EEF8',
  greenWash: '#E7F0ED',
  pinionFill: '#D5E3DE',
  wheelFill: '#E9EEEB',
};

export const dark: Colours = {
  paper: '#14191A',
  sheet: '#1B2223',
  raised: '#242D2E',
  ink: '#E7E4DA',
  pencil: '#A3AEAC',
  rule: '#2E3839',
  ruleStrong: '#6C7977',
  green: '#7FC7B4',
  onGreen: '#0B211C',
  greenDeep: '#9AD8C7',
  brass: '#DDB362',
  rust: '#F2977E',
  plum: '#BDADEB',
  slate: '#9FB7C2',
  brassWash: '#2E2817',
  hoverWash: '#222B2B',
  rustWash: '#35211C',
  plumWash: '#28243A',
  greenWash: '#1C302B',
  pinionFill: '#2C4A43',
  wheelFill: '#253230',
};
