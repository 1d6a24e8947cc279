import ErrorOutlineIcon from '@mui/icons-material/ErrorOutlineOutlined';
import Box from '@mui/material/Box';
import { createContext, useContext } from 'react';
import type { Hint } from '../hints/hint';
import type { BriefField } from './briefForm';

/** Every live remark on the form; fields pick their own. */
export const RemarksContext = createContext<readonly Hint[]>([]);

export function useRemarks(field: BriefField): Hint[] {
  return useContext(RemarksContext).filter((remark) => remark.field === field);
}

/** Remarks under a field. A crossed limit carries an icon and a word, not only a colour. */
export function FieldRemarks({ id, remarks }: { id: string; remarks: readonly Hint[] }) {
  if (remarks.length === 0) return null;
  return (
    <Box id={id} sx={{ mt: 0.5, fontSize: '0.75rem', lineHeight: 1.4 }}>
      {remarks.map((remark) => (
        <Box
          key={remark.message}
          sx={{
            display: 'flex',
            gap: 0.5,
            color: remark.kind === 'crossed' ? 'error.main' : 'text.secondary',
          }}
        >
          {remark.kind === 'crossed' && (
            <ErrorOutlineIcon titleAccess="Cannot be met" sx={{ fontSize: 14, mt: '1.5px', flexShrink: 0 }} />
          )}
          <span>{remark.message}</span>
        </Box>
      ))}
    </Box>
  );
}
