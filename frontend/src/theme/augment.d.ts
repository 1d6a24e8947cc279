import type {} from '@mui/material/themeCssVarsAugmentation';
import type {} from '@mui/x-data-grid/themeAugmentation';

interface Washes {
  brass: string;
  hover: string;
  rust: string;
  plum: string;
  green: string;
}

interface Lines {
  rule: string;
  strong: string;
}

interface DrawingColours {
  outline: string;
  centre: string;
  dimension: string;
  faint: string;
  pinion: string;
  wheel: string;
  sheet: string;
  text: string;
  fails: string;
}

declare module '@mui/material/styles' {
  interface Palette {
    wash: Washes;
    line: Lines;
    drawing: DrawingColours;
  }
  interface PaletteOptions {
    wash?: Washes;
    line?: Lines;
    drawing?: DrawingColours;
  }
}

declare module '@mui/material/Button' {
  interface ButtonPropsVariantOverrides {
    contained: true;
  }
}
