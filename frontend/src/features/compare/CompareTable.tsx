import CheckIcon from '@mui/icons-material/Check';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import Typography from '@mui/material/Typography';
import { trainStrip } from '@stageyard/libs/train-planner';
import { useMemo } from 'react';
import type { Pin } from '../../api/types';
import { CopyTable } from '../../components/CopyTable';
import { moduleWords, stageCountWords, teethWords } from '../../components/optionWords';
import { TrainDrawing } from '../../drawings/TrainDrawing';
import { comparedFigures, type ComparedSupply } from './figures';

interface CompareTableProps {
  pins: readonly Pin[];
  differencesOnly: boolean;
  /** Cost and stock, once the brief names a build quantity and the answer is there. */
  supply?: ComparedSupply;
  /** Left out for readers. */
  onAdopt?: (pin: Pin) => void;
  onUnpin?: (pin: Pin) => void;
}

/** px for one drawing, by how many stand side by side. */
const DRAWING_WIDTHS = [0, 620, 400, 286, 222];
/** What the drawing keeps free at its sides without dimensions, px. */
const DRAWING_SIDES = 40;
const MOST_TALL = 300;
const LABEL_WIDTH = 168;
/** Between the margins of an upright A4 sheet, px. */
const PAPER_WIDTH = 700;

/** Up to four options side by side: drawings on one scale, figures with the better one marked. */
export function CompareTable({ pins, differencesOnly, supply, onAdopt, onUnpin }: CompareTableProps) {
  const options = useMemo(() => pins.map(({ option }) => option), [pins]);
  const figures = useMemo(() => comparedFigures(options, supply), [options, supply]);
  const shown = figures.filter(({ same }) => !(differencesOnly && same));
  const width = DRAWING_WIDTHS[pins.length] ?? 222;
  const scale = useMemo(() => scaleFor(options, width), [options, width]);
  return (
    <Box
      sx={{
        bgcolor: 'background.paper',
        border: '1px solid',
        borderColor: 'line.rule',
        overflowX: 'auto',
        // The whole table shrinks, not each drawing for itself: they stay on one scale.
        '@media print': { zoom: Math.min(1, PAPER_WIDTH / (LABEL_WIDTH + pins.length * (width + 20))) },
      }}
    >
      <CopyTable
        label="Options side by side"
        sx={{ width: pins.length < 3 ? 'auto' : '100%', minWidth: { md: '100%' } }}
      >
        <TableHead>
          <TableRow>
            <TableCell sx={{ verticalAlign: 'bottom', minWidth: { xs: 110, sm: LABEL_WIDTH } }}>
              <Typography variant="body2" color="textSecondary">
                All drawn on one scale
              </Typography>
            </TableCell>
            {pins.map((pin) => (
              <TableCell key={pin.key} scope="col" sx={{ minWidth: width + 20, verticalAlign: 'bottom' }}>
                <Box sx={{ width, overflow: 'hidden' }}>
                  <TrainDrawing train={pin.option} mmPerPixel={scale} dimensions={false} />
                </Box>
                <Typography variant="h2" component="p" sx={{ color: 'text.primary' }}>
                  {teethWords(pin.option.stages)}
                </Typography>
                <Typography variant="body2" color="textSecondary">
                  {stageCountWords(pin.option.stages.length)}, {moduleWords(pin.option.stages)}
                </Typography>
                {(onAdopt || onUnpin) && (
                  <Box sx={{ mt: 0.75, mb: 0.5, display: 'flex', gap: 1, displayPrint: 'none' }}>
                    {onAdopt && (
                      <Button variant="outlined" onClick={() => onAdopt(pin)}>
                        Adopt as train
                      </Button>
                    )}
                    {onUnpin && <Button onClick={() => onUnpin(pin)}>Unpin</Button>}
                  </Box>
                )}
              </TableCell>
            ))}
          </TableRow>
        </TableHead>
        <TableBody>
          {shown.map((figure) => (
            <TableRow key={figure.label}>
              <TableCell component="th" scope="row" sx={{ fontWeight: 400 }}>
                {figure.label}
                {figure.unit && (
                  <Box component="span" sx={{ color: 'text.secondary' }}>{`, ${figure.unit}`}</Box>
                )}
              </TableCell>
              {figure.cells.map((cell, column) => (
                <TableCell
                  key={pins[column]?.key}
                  sx={cell.better ? { bgcolor: 'wash.green', fontWeight: 600 } : undefined}
                >
                  {cell.words}
                  {cell.better && <Better word={pins.length > 2 ? 'best' : 'better'} />}
                </TableCell>
              ))}
            </TableRow>
          ))}
          {shown.length === 0 && (
            <TableRow>
              <TableCell colSpan={pins.length + 1}>These options read the same in every figure.</TableCell>
            </TableRow>
          )}
        </TableBody>
      </CopyTable>
    </Box>
  );
}

/** Of two one is better; of three or four one is best. */
function Better({ word }: { word: 'better' | 'best' }) {
  return (
    <Box
      component="span"
      sx={{
        color: 'success.main',
        ml: 1,
        fontWeight: 500,
        fontSize: '0.75rem',
        whiteSpace: 'nowrap',
        '& svg': { fontSize: '1.1em', verticalAlign: '-0.15em', mr: 0.25 },
      }}
    >
      <CheckIcon aria-hidden />
      {word}
    </Box>
  );
}

/** mm a pixel at which the longest and the tallest of them fit. */
function scaleFor(options: readonly Pin['option'][], width: number): number {
  let scale = 1e-6;
  for (const option of options) {
    const { bounds } = trainStrip(option);
    scale = Math.max(
      scale,
      bounds.width / (width - DRAWING_SIDES),
      (bounds.height + option.box.width) / MOST_TALL,
    );
  }
  return scale;
}
