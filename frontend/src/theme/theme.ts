import { createTheme, type PaletteOptions } from '@mui/material/styles';
import { componentLook } from './components';
import { dark, light, type Colours } from './palette';

/** Text stack; IBM Plex Sans is shipped with the app (see fonts.ts). */
const PLEX = '"IBM Plex Sans", "Helvetica Neue", Arial, sans-serif';

function paletteOf(c: Colours): PaletteOptions {
  const ink = { contrastText: c.onGreen };
  return {
    primary: { main: c.green, dark: c.greenDeep, light: c.green, ...ink },
    secondary: { main: c.brass, dark: c.brass, light: c.brass, ...ink },
    error: { main: c.rust, dark: c.rust, light: c.rust, ...ink },
    warning: { main: c.plum, dark: c.plum, light: c.plum, ...ink },
    info: { main: c.slate, dark: c.slate, light: c.slate, ...ink },
    success: { main: c.green, dark: c.green, light: c.green, ...ink },
    background: { default: c.paper, paper: c.sheet },
    text: { primary: c.ink, secondary: c.pencil, disabled: c.pencil },
    divider: c.rule,
    action: { hover: c.hoverWash, selected: c.brassWash, active: c.pencil, disabledBackground: c.rule },
    wash: { brass: c.brassWash, hover: c.hoverWash, rust: c.rustWash, plum: c.plumWash, green: c.greenWash },
    line: { rule: c.rule, strong: c.ruleStrong },
    drawing: {
      outline: c.ink,
      centre: c.slate,
      dimension: c.brass,
      faint: c.ruleStrong,
      pinion: c.pinionFill,
      wheel: c.wheelFill,
      sheet: c.sheet,
      text: c.pencil,
      fails: c.rust,
    },
    DataGrid: { bg: c.sheet, headerBg: c.sheet, pinnedBg: c.sheet },
  };
}

/** The product's theme: two schemes behind CSS variables (`--sy-…`), compact density, figures that line up. */
export const theme = createTheme({
  cssVariables: { cssVarPrefix: 'sy', colorSchemeSelector: '[data-scheme="%s"]' },
  colorSchemes: { light: { palette: paletteOf(light) }, dark: { palette: paletteOf(dark) } },
  shape: { borderRadius: 3 },
  spacing: 8,
  breakpoints: { values: { xs: 0, sm: 600, md: 900, lg: 1200, xl: 1536 } },
  typography: {
    fontFamily: PLEX,
    fontSize: 14,
    fontWeightRegular: 400,
    fontWeightMedium: 500,
    fontWeightBold: 600,
    h1: { fontSize: '1.375rem', lineHeight: 1.25, fontWeight: 600, letterSpacing: '-0.005em' },
    h2: { fontSize: '0.9375rem', lineHeight: 1.35, fontWeight: 600 },
    h3: { fontSize: '0.875rem', lineHeight: 1.35, fontWeight: 600 },
    body1: { fontSize: '0.875rem', lineHeight: 1.5 },
    body2: { fontSize: '0.8125rem', lineHeight: 1.45 },
    caption: { fontSize: '0.75rem', lineHeight: 1.4 },
    button: { fontSize: '0.875rem', fontWeight: 600, textTransform: 'none', letterSpacing: 0 },
  },
  components: componentLook,
});
