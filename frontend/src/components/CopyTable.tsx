import type { Theme } from '@mui/material/styles';
import Table, { type TableProps } from '@mui/material/Table';
import type { ReactNode } from 'react';
import { SelectionBar } from './SelectionBar';
import { useCopyTable } from './useCopyTable';

interface CopyTableProps extends Omit<TableProps, 'ref' | 'onKeyDown' | 'onClickCapture'> {
  /** Names the table for a screen reader. */
  label: string;
  /** A plain click on a row leads on; Ctrl or Shift with the click selects it instead. */
  opens?: boolean;
  children: ReactNode;
}

/**
 * A plain table whose rows can be selected and copied as tab-separated text: click, Shift and Ctrl with the mouse;
 * arrows, Space, Ctrl+A and Ctrl+C on the keyboard. A cell with `data-copy` is copied as that says.
 */
export function CopyTable({ label, opens = false, children, sx, ...table }: CopyTableProps) {
  const { tableProps, selected, copy, clear } = useCopyTable(opens);
  return (
    <>
      <Table
        {...table}
        {...tableProps}
        aria-label={label}
        sx={[SELECTED, ...(Array.isArray(sx) ? (sx as readonly object[]) : [sx ?? {}])] as TableProps['sx']}
      >
        {children}
      </Table>
      <SelectionBar count={selected} onCopy={copy} onClear={clear} />
    </>
  );
}

const SELECTED = {
  '& tbody tr': { outlineOffset: '-2px' },
  '& tbody tr[aria-selected="true"], & tbody tr[aria-selected="true"]:hover': {
    bgcolor: 'wash.brass',
    boxShadow: (theme: Theme) => `inset 3px 0 0 ${theme.vars.palette.secondary.main}`,
  },
} as const;
