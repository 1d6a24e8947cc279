import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { copyTsv } from '../copyTsv';
import { useNotices } from '../Notices';
import type { PasteColumnsHelp } from './pasteTypes';

/** Which columns may be pasted, and an example to copy. */
export function PasteHelp({ help, open }: { help: PasteColumnsHelp; open: boolean }) {
  const { tell } = useNotices();
  const copy = async () => {
    const done = await copyTsv(help.example);
    tell(
      done
        ? 'Example copied; paste it into a spreadsheet, or into the box here.'
        : 'The browser does not let this page use the clipboard.',
    );
  };
  return (
    <Box
      component="details"
      open={open}
      sx={{ mb: 1.5, '& summary': { cursor: 'pointer', fontWeight: 500 } }}
    >
      <summary>Which columns are read, with an example</summary>
      <Typography color="textSecondary" sx={{ mt: 0.5 }}>
        Copy the rows in your spreadsheet and paste them below. With heads in the first row the columns may
        stand in any order; without heads, in this one:
      </Typography>
      <Box component="dl" sx={listSx}>
        {help.columns.map(({ name, hint, required }) => (
          <Box key={name}>
            <dt>
              <b>{name}</b>
              {required && ' (needed)'}
            </dt>
            <Box component="dd" sx={{ m: 0, color: 'text.secondary' }}>
              {hint}
            </Box>
          </Box>
        ))}
      </Box>
      <Box sx={{ display: 'flex', alignItems: 'flex-start', gap: 1, flexWrap: 'wrap' }}>
        <Box sx={{ overflowX: 'auto', maxWidth: '100%' }} tabIndex={0} role="region" aria-label="Example">
          <Box component="table" sx={exampleSx}>
            <tbody>
              {help.example.map((cells, row) => (
                <tr key={row}>
                  {cells.map((cell, column) => (
                    <td key={column}>{cell}</td>
                  ))}
                </tr>
              ))}
            </tbody>
          </Box>
        </Box>
        <Button variant="outlined" onClick={() => void copy()}>
          Copy the example
        </Button>
      </Box>
    </Box>
  );
}

const listSx = {
  display: 'grid',
  gridTemplateColumns: { xs: '1fr', sm: 'repeat(auto-fill, minmax(210px, 1fr))' },
  columnGap: 2,
  rowGap: 0.75,
  my: 1,
  fontSize: '0.8125rem',
} as const;

const exampleSx = {
  borderCollapse: 'collapse',
  fontSize: '0.8125rem',
  '& td': { border: '1px solid', borderColor: 'line.rule', px: 0.75, py: 0.25, whiteSpace: 'nowrap' },
  '& tr:first-of-type td': { color: 'text.secondary' },
} as const;
