import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';

interface FormSectionProps {
  title: string;
  /** One plain remark under the heading. */
  remark?: string;
  /** Narrower fields, so that four stand in a row. */
  dense?: boolean;
  children: ReactNode;
}

/** A heading at the side and its fields in a row beside it; stacked on a narrow screen. */
export function FormSection({ title, remark, dense = false, children }: FormSectionProps) {
  return (
    <Box
      component="section"
      aria-label={title}
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: '1fr', sm: '148px 1fr' },
        columnGap: 3,
        rowGap: 1,
        px: { xs: 1.5, sm: 2 },
        py: 1.75,
        borderBottom: '1px solid',
        borderColor: 'line.rule',
        '&:last-of-type': { borderBottom: 0 },
      }}
    >
      <div>
        <Typography variant="h2">{title}</Typography>
        {remark && (
          <Typography variant="body2" color="textSecondary" sx={{ mt: 0.25 }}>
            {remark}
          </Typography>
        )}
      </div>
      <Box
        sx={{
          display: 'grid',
          gridTemplateColumns: `repeat(auto-fill, minmax(${dense ? 128 : 172}px, 1fr))`,
          columnGap: 2,
          rowGap: 1.5,
          alignItems: 'start',
          minWidth: 0,
        }}
      >
        {children}
      </Box>
    </Box>
  );
}

/** A field that takes the whole row of its section. */
export function WholeRow({ children }: { children: ReactNode }) {
  return <Box sx={{ gridColumn: '1 / -1', minWidth: 0 }}>{children}</Box>;
}
