import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableContainer from '@mui/material/TableContainer';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import ToggleButton from '@mui/material/ToggleButton';
import ToggleButtonGroup from '@mui/material/ToggleButtonGroup';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { CopyTable } from '../CopyTable';
import { formatCount, NOTHING } from '../figures';
import { countsOf, type PastePreview, type PasteRow } from './pasteTypes';
import { actionWords, problemWords } from './pasteWords';

/** Rows drawn at a time: thousands at once would make the page slow. */
const AT_A_TIME = 100;
const ALL = 'all';

/** Row by row what booking would do; wrong rows first, where there are any. */
export function PasteRows({ preview }: { preview: PastePreview }) {
  const { rows, columns } = preview;
  const counts = countsOf(rows);
  const [shown, setShown] = useState(counts.has('wrong') ? 'wrong' : ALL);
  const [most, setMost] = useState(AT_A_TIME);
  const chosen = shown === ALL ? rows : rows.filter(({ action }) => action === shown);
  return (
    <Box sx={{ mt: 1.5 }}>
      <Box sx={{ display: 'flex', gap: 1.5, alignItems: 'center', flexWrap: 'wrap', mb: 0.75 }}>
        <ToggleButtonGroup
          exclusive
          size="small"
          value={shown}
          aria-label="Rows to show"
          onChange={(_, value: string | null) => {
            if (value === null) return;
            setShown(value);
            setMost(AT_A_TIME);
          }}
          sx={{ flexWrap: 'wrap' }}
        >
          <ToggleButton value={ALL}>{formatCount(rows.length)} in all</ToggleButton>
          {[...counts].map(([action, count]) => (
            <ToggleButton key={action} value={action}>
              {formatCount(count)} {actionWords(action)}
            </ToggleButton>
          ))}
        </ToggleButtonGroup>
      </Box>
      <Typography variant="body2" color="textSecondary" sx={{ mb: 0.75 }}>
        {columnsWords(columns)}
      </Typography>
      <TableContainer sx={{ maxHeight: 420, border: '1px solid', borderColor: 'line.rule' }}>
        <CopyTable label="What booking would do" stickyHeader>
          <TableHead>
            <TableRow>
              <TableCell align="right" sx={{ width: 52 }}>
                Row
              </TableCell>
              <TableCell sx={{ width: { sm: 120 } }}>What happens</TableCell>
              <TableCell sx={{ ...WIDE_ONLY, width: 230 }}>Part</TableCell>
              <TableCell>Details</TableCell>
            </TableRow>
          </TableHead>
          <TableBody>
            {chosen.slice(0, most).map((row) => (
              <Row key={row.row} row={row} />
            ))}
          </TableBody>
        </CopyTable>
      </TableContainer>
      {chosen.length > most && (
        <Button onClick={() => setMost(most + AT_A_TIME)} sx={{ mt: 0.5 }}>
          Show more ({formatCount(chosen.length - most)} left)
        </Button>
      )}
    </Box>
  );
}

function Row({ row }: { row: PasteRow }) {
  const wrong = row.action === 'wrong';
  return (
    <TableRow sx={{ '& > td': { verticalAlign: 'top' } }}>
      <TableCell align="right">{row.row}</TableCell>
      <TableCell sx={wrong ? { color: 'error.main', fontWeight: 600 } : undefined}>
        {wrong && <span aria-hidden="true">✕ </span>}
        {actionWords(row.action)}
      </TableCell>
      <TableCell sx={WIDE_ONLY}>
        <span className="part-number">{row.partNumber ?? NOTHING}</span>
        {row.partDescription && (
          <Box sx={{ color: 'text.secondary', fontSize: '0.75rem' }}>{row.partDescription}</Box>
        )}
      </TableCell>
      <TableCell sx={{ overflowWrap: 'anywhere' }}>
        {/* A phone has no room for the part's own column. */}
        <Box className="part-number" sx={{ display: { sm: 'none' } }}>
          {row.partNumber ?? NOTHING}
        </Box>
        {row.problems.map((problem, index) => (
          <div key={index}>{problemWords(problem)}</div>
        ))}
        {row.changes.map((change) => (
          <div key={change}>{change}</div>
        ))}
        {row.problems.length === 0 && row.changes.length === 0 && row.summary}
      </TableCell>
    </TableRow>
  );
}

const WIDE_ONLY = { display: { xs: 'none', sm: 'table-cell' } } as const;

/** Columns of the text that no name fits come from the server under this name. */
const LEFT_OUT = 'left out';

/** "Read as: Part number, Price (from “Netto”). Left out: “Weight”." */
function columnsWords(columns: PastePreview['columns']): string {
  const read = columns.filter(({ name }) => name !== LEFT_OUT).map(columnWords);
  const left = columns.filter(({ name }) => name === LEFT_OUT).map(({ from }) => `“${from ?? ''}”`);
  return `Read as: ${read.join(', ')}.${left.length > 0 ? ` Left out: ${left.join(', ')}.` : ''}`;
}

const columnWords = ({ name, from }: PastePreview['columns'][number]): string =>
  from === null
    ? name
    : from.toLowerCase().startsWith(name.toLowerCase())
      ? from
      : `${name} (from “${from}”)`;
