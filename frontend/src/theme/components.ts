import type { Components, Theme } from '@mui/material/styles';

/** The product's own look of the component library: flat sheets, hairlines, labels above fields, no ripples. */
type Look = Components<Omit<Theme, 'components'>>;

const focusRing = (theme: Omit<Theme, 'components'>) => ({
  outline: `2px solid ${theme.vars.palette.secondary.main}`,
  outlineOffset: 1,
});

const controls: Look = {
  MuiButtonBase: {
    defaultProps: { disableRipple: true },
    styleOverrides: { root: ({ theme }) => ({ '&.Mui-focusVisible': focusRing(theme) }) },
  },
  MuiButton: {
    defaultProps: { disableElevation: true, size: 'small' },
    styleOverrides: {
      root: { minHeight: 34, paddingInline: 14, borderRadius: 3, whiteSpace: 'nowrap' },
      outlined: ({ theme }) => ({
        borderColor: 'currentColor',
        backgroundColor: 'transparent',
        '&:hover': { backgroundColor: theme.vars.palette.wash.green },
      }),
      text: ({ theme }) => ({
        paddingInline: 8,
        '&:hover': { backgroundColor: theme.vars.palette.wash.hover },
      }),
    },
  },
  MuiIconButton: {
    defaultProps: { size: 'small' },
    styleOverrides: {
      root: ({ theme }) => ({
        borderRadius: 3,
        color: theme.vars.palette.text.secondary,
        '&:hover': { backgroundColor: theme.vars.palette.wash.hover },
      }),
    },
  },
  MuiCheckbox: { defaultProps: { size: 'small' }, styleOverrides: { root: { padding: 5, borderRadius: 3 } } },
  MuiRadio: { defaultProps: { size: 'small' }, styleOverrides: { root: { padding: 5 } } },
  MuiToggleButton: {
    styleOverrides: {
      root: ({ theme }) => ({
        paddingBlock: 3,
        paddingInline: 10,
        color: theme.vars.palette.text.secondary,
        borderColor: theme.vars.palette.line.rule,
        '&.Mui-selected, &.Mui-selected:hover': {
          color: theme.vars.palette.text.primary,
          backgroundColor: theme.vars.palette.wash.brass,
          boxShadow: `inset 0 -2px 0 ${theme.vars.palette.secondary.main}`,
        },
      }),
    },
  },
};

const fields: Look = {
  MuiTextField: { defaultProps: { size: 'small', variant: 'outlined' } },
  MuiFormControl: { defaultProps: { size: 'small' } },
  MuiInputLabel: {
    defaultProps: { shrink: true },
    styleOverrides: {
      // Labels stand above their field and stay there; nothing floats.
      root: ({ theme }) => ({
        position: 'static',
        transform: 'none',
        fontSize: '0.8125rem',
        lineHeight: 1.4,
        fontWeight: 500,
        marginBottom: 3,
        maxWidth: '100%',
        whiteSpace: 'normal',
        color: theme.vars.palette.text.secondary,
        '&.Mui-focused': { color: theme.vars.palette.text.primary },
        '&.Mui-error': { color: theme.vars.palette.error.main },
      }),
    },
  },
  MuiOutlinedInput: {
    defaultProps: { notched: false },
    styleOverrides: {
      root: ({ theme }) => ({
        backgroundColor: theme.vars.palette.background.paper,
        borderRadius: 3,
        '& fieldset': { top: 0, borderColor: theme.vars.palette.line.strong },
        '& legend': { display: 'none' },
        '&:hover:not(.Mui-error) fieldset': { borderColor: theme.vars.palette.text.primary },
        '&.Mui-focused:not(.Mui-error) .MuiOutlinedInput-notchedOutline': {
          borderColor: theme.vars.palette.secondary.main,
          borderWidth: 2,
        },
      }),
      input: ({ theme }) => ({
        '&::placeholder': { color: theme.vars.palette.text.secondary, opacity: 1 },
        paddingBlock: 6.5,
        paddingInline: 10,
        height: '1.3125rem',
        '&.MuiInputBase-inputMultiline': { height: 'auto' },
      }),
      multiline: { padding: 0 },
    },
  },
  MuiSelect: { styleOverrides: { select: { minHeight: '1.3125rem', lineHeight: '1.3125rem' } } },
  MuiFormHelperText: { styleOverrides: { root: { marginInline: 0, marginTop: 3, lineHeight: 1.35 } } },
  MuiFormControlLabel: { styleOverrides: { label: { fontSize: '0.875rem' } } },
};

const surfaces: Look = {
  MuiPaper: {
    defaultProps: { elevation: 0, square: false },
    styleOverrides: { root: { backgroundImage: 'none' } },
  },
  MuiMenu: {
    styleOverrides: {
      paper: ({ theme }) => ({
        border: `1px solid ${theme.vars.palette.line.rule}`,
        boxShadow: '0 6px 20px rgb(0 0 0 / 0.16)',
      }),
      list: { paddingBlock: 4 },
    },
  },
  MuiAutocomplete: {
    styleOverrides: {
      // As high as the other fields.
      root: {
        '& .MuiOutlinedInput-root.MuiInputBase-sizeSmall': {
          paddingBlock: 4,
          '&:not(.MuiInputBase-adornedStart)': { paddingLeft: 2 },
        },
      },
      paper: ({ theme }) => ({
        marginTop: 2,
        border: `1px solid ${theme.vars.palette.line.rule}`,
        boxShadow: '0 6px 20px rgb(0 0 0 / 0.16)',
      }),
      listbox: { paddingBlock: 4 },
      groupLabel: ({ theme }) => ({
        lineHeight: '26px',
        fontSize: '0.75rem',
        fontWeight: 500,
        backgroundColor: theme.vars.palette.background.paper,
        color: theme.vars.palette.text.secondary,
      }),
      option: { minHeight: 30, fontSize: '0.875rem' },
    },
  },
  MuiMenuItem: {
    styleOverrides: {
      root: ({ theme }) => ({
        minHeight: 32,
        fontSize: '0.875rem',
        paddingInline: 12,
        '&.Mui-selected, &.Mui-selected:hover': { backgroundColor: theme.vars.palette.wash.brass },
        '&.Mui-focusVisible': { backgroundColor: theme.vars.palette.wash.hover, outlineOffset: -2 },
      }),
    },
  },
  MuiDialog: {
    styleOverrides: {
      paper: ({ theme }) => ({ border: `1px solid ${theme.vars.palette.line.rule}`, borderRadius: 4 }),
    },
  },
  MuiDialogTitle: {
    styleOverrides: { root: { fontSize: '1.0625rem', fontWeight: 600, padding: '18px 20px 8px' } },
  },
  MuiDialogContent: { styleOverrides: { root: { padding: '4px 20px 12px' } } },
  MuiDialogActions: { styleOverrides: { root: { padding: '8px 20px 18px' } } },
  MuiAlert: {
    defaultProps: { variant: 'outlined' },
    styleOverrides: {
      root: ({ theme }) => ({
        borderRadius: 3,
        padding: '4px 12px',
        color: theme.vars.palette.text.primary,
        backgroundColor: theme.vars.palette.background.paper,
      }),
    },
  },
  MuiTooltip: {
    defaultProps: { arrow: false, enterDelay: 400 },
    styleOverrides: {
      tooltip: ({ theme }) => ({
        fontSize: '0.75rem',
        backgroundColor: theme.vars.palette.text.primary,
        color: theme.vars.palette.background.paper,
      }),
    },
  },
  MuiSkeleton: {
    defaultProps: { animation: 'wave' },
    styleOverrides: { root: ({ theme }) => ({ backgroundColor: theme.vars.palette.wash.hover }) },
  },
  MuiChip: { styleOverrides: { root: { borderRadius: 3, height: 24 } } },
  MuiLink: {
    defaultProps: { underline: 'hover' },
    styleOverrides: {
      root: ({ theme }) => ({ fontWeight: 500, '&:focus-visible': focusRing(theme) }),
    },
  },
};

const tables: Look = {
  MuiTable: { defaultProps: { size: 'small' } },
  MuiTableCell: {
    styleOverrides: {
      root: ({ theme }) => ({
        fontVariantNumeric: 'tabular-nums',
        padding: '5px 10px',
        borderBottom: `1px solid ${theme.vars.palette.line.rule}`,
        fontSize: '0.875rem',
        lineHeight: 1.4,
      }),
      head: ({ theme }) => ({
        fontWeight: 500,
        color: theme.vars.palette.text.secondary,
        borderBottom: `1px solid ${theme.vars.palette.text.primary}`,
        verticalAlign: 'bottom',
      }),
    },
  },
  MuiTableRow: {
    styleOverrides: {
      root: ({ theme }) => ({
        '&.Mui-selected, &.Mui-selected:hover': { backgroundColor: theme.vars.palette.wash.brass },
        '&.MuiTableRow-hover:hover': { backgroundColor: theme.vars.palette.wash.hover },
      }),
    },
  },
  MuiTabs: {
    styleOverrides: {
      root: ({ theme }) => ({ minHeight: 36, borderBottom: `1px solid ${theme.vars.palette.line.rule}` }),
      indicator: ({ theme }) => ({ backgroundColor: theme.vars.palette.secondary.main }),
    },
  },
  MuiTab: {
    styleOverrides: {
      root: ({ theme }) => ({
        minHeight: 36,
        minWidth: 0,
        padding: '6px 2px',
        marginRight: 24,
        fontWeight: 500,
        color: theme.vars.palette.text.secondary,
        '&.Mui-selected': { color: theme.vars.palette.text.primary, fontWeight: 600 },
      }),
    },
  },
};

/** Data grid: flat, hairlines, head ruled in ink like our own tables. */
const grid: Look = {
  MuiDataGrid: {
    defaultProps: { density: 'compact' },
    styleOverrides: {
      root: ({ theme }) => ({
        border: 0,
        borderRadius: 0,
        fontSize: '0.875rem',
        fontVariantNumeric: 'tabular-nums',
        '--DataGrid-rowBorderColor': theme.vars.palette.line.rule,
        '& .MuiDataGrid-columnHeaders': { borderBottom: `1px solid ${theme.vars.palette.text.primary}` },
        '& .MuiDataGrid-columnHeaderTitle': { fontWeight: 500, color: theme.vars.palette.text.secondary },
        '& .MuiDataGrid-columnSeparator': { opacity: 0 },
        '& .MuiDataGrid-columnHeader:hover .MuiDataGrid-columnSeparator': { opacity: 1 },
        '& .MuiDataGrid-cell': { paddingInline: 10 },
        '& .MuiDataGrid-columnHeader': { paddingInline: 10 },
        // The mark of the sorted column takes little, so that the column's name stays whole.
        '& .MuiDataGrid-sortButton': { padding: 0, fontSize: '1rem', '& svg': { fontSize: '1rem' } },
        '& .MuiDataGrid-cell:focus-visible, & .MuiDataGrid-columnHeader:focus-visible': {
          outline: `2px solid ${theme.vars.palette.secondary.main}`,
          outlineOffset: -2,
        },
        '& .MuiDataGrid-row': { cursor: 'pointer' },
        '& .MuiDataGrid-row:hover': { backgroundColor: theme.vars.palette.wash.hover },
        '& .MuiDataGrid-row.Mui-selected, & .MuiDataGrid-row.Mui-selected:hover': {
          backgroundColor: theme.vars.palette.wash.brass,
          boxShadow: `inset 3px 0 0 ${theme.vars.palette.secondary.main}`,
        },
        '& .MuiDataGrid-footerContainer': {
          minHeight: 40,
          borderTop: `1px solid ${theme.vars.palette.line.rule}`,
        },
      }),
    },
  },
};

const ground: Look = {
  MuiCssBaseline: {
    styleOverrides: (theme) => ({
      body: { fontSize: '0.875rem', fontVariantNumeric: 'tabular-nums', textRendering: 'optimizeLegibility' },
      ':focus-visible': { ...focusRing(theme) },
      '.number': { textAlign: 'right', fontVariantNumeric: 'tabular-nums' },
      '.part-number': { whiteSpace: 'nowrap', fontWeight: 500 },
      '@media (prefers-reduced-motion: reduce)': {
        '*, *::before, *::after': {
          animationDuration: '0.01ms !important',
          transitionDuration: '0.01ms !important',
        },
      },
    }),
  },
};

export const componentLook: Look = { ...ground, ...controls, ...fields, ...surfaces, ...tables, ...grid };
