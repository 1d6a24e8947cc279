import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useEffect, type ReactNode } from 'react';

interface PageHeaderProps {
  title: string;
  /** Stands before the title in heavier type: a code such as T-0001. */
  code?: string;
  /** One line of facts under the title, parted by " · ". */
  facts?: ReactNode;
  /** To the left of the title: a train strip. */
  figure?: ReactNode;
  /** At most one contained button, the page's primary action, last. */
  actions?: ReactNode;
}

/** Head of every page; also sets the document's title. */
export function PageHeader({ title, code, facts, figure, actions }: PageHeaderProps) {
  const full = code === undefined ? title : `${code} ${title}`;
  useEffect(() => {
    document.title = `${full} · Stageyard`;
  }, [full]);
  return (
    <Box
      sx={{
        display: 'flex',
        flexWrap: 'wrap',
        alignItems: 'center',
        columnGap: 3,
        rowGap: 1,
        mb: 1.5,
        minHeight: 40,
      }}
    >
      {figure}
      <Box
        sx={{
          flex: { xs: facts === undefined && code === undefined ? '1 1 0' : '1 1 300px', sm: '1 1 300px' },
          minWidth: 0,
        }}
      >
        <Typography variant="h1" sx={{ overflowWrap: 'anywhere' }}>
          {code !== undefined && (
            <Box component="span" sx={{ mr: 0.5, whiteSpace: 'nowrap' }}>
              {code}
            </Box>
          )}
          {/* A gap for readers of text, too: the name is “B-0001 Winch”. */}
          {code !== undefined && ' '}
          <Box component="span" sx={{ fontWeight: code === undefined ? 600 : 400 }}>
            {title}
          </Box>
        </Typography>
        {facts !== undefined && (
          <Typography component="div" color="textSecondary">
            {facts}
          </Typography>
        )}
      </Box>
      {actions !== undefined && (
        <Box sx={{ display: 'flex', gap: 1, flexWrap: 'wrap', displayPrint: 'none' }}>{actions}</Box>
      )}
    </Box>
  );
}
