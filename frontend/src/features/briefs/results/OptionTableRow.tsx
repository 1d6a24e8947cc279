import PushPin from '@mui/icons-material/PushPinOutlined';
import Box from '@mui/material/Box';
import Checkbox from '@mui/material/Checkbox';
import TableCell from '@mui/material/TableCell';
import TableRow from '@mui/material/TableRow';
import { formatNumber } from '@stageyard/libs/units';
import type { ComponentProps } from 'react';
import type { TrainOption } from '../../../api/types';
import {
  boxWords,
  errorWords,
  exactRatioWords,
  leastContactWords,
  moduleWords,
  ratioWords,
  teethWords,
} from '../../../components/optionWords';
import { TrainStrip } from '../../../drawings/TrainStrip';
import { orderWords, type StageOrder } from './stageOrders';
import { CostCell, StockCell, type ShownSupply } from './SupplyCells';

/** The box a strip stands in, px. */
export const STRIP = { width: 98, height: 36 } as const;

interface OptionTableRowProps {
  option: TrainOption;
  scale: number;
  /** Where it stands among the options with the same stages; left out where it is the only one. */
  order?: StageOrder;
  pinned: boolean;
  onPin?: (option: TrainOption, pin: boolean) => void;
  /** Cost and stock columns, where there are any. */
  supply?: ShownSupply;
  rowProps: ComponentProps<typeof TableRow>;
}

export function OptionTableRow(props: OptionTableRowProps) {
  const { option, scale, order, pinned, onPin, supply, rowProps } = props;
  const teeth = teethWords(option.stages);
  return (
    <TableRow
      hover
      {...rowProps}
      sx={(theme) => ({
        height: 37,
        cursor: 'default',
        outlineOffset: -2,
        ...(pinned && {
          bgcolor: 'wash.brass',
          boxShadow: `inset 3px 0 0 ${theme.vars.palette.secondary.main}`,
        }),
        '&[aria-selected="true"]': { bgcolor: pinned ? 'wash.brass' : 'wash.hover' },
        '&[aria-selected="true"] td:nth-of-type(3)': { fontWeight: 600 },
      })}
    >
      <TableCell>
        {onPin ? (
          <Checkbox
            checked={pinned}
            onChange={(_, pin) => onPin(option, pin)}
            slotProps={{ input: { 'aria-label': `Pin ${teeth}`, tabIndex: -1 } }}
            sx={{ p: 0.5, '& svg': { fontSize: 18 }, '&.Mui-checked': { color: 'secondary.main' } }}
          />
        ) : (
          pinned && <PushPin titleAccess="Pinned" sx={{ fontSize: 16, color: 'secondary.main', m: 0.5 }} />
        )}
      </TableCell>
      <TableCell>
        <TrainStrip train={option} width={STRIP.width} height={STRIP.height} mmPerPixel={scale} />
      </TableCell>
      <TableCell sx={{ lineHeight: 1.25 }}>
        <Box>{teeth}</Box>
        <Box
          sx={{ color: 'text.secondary', fontSize: '0.6875rem' }}
          title={
            order &&
            `${order.of} options here have these very stages, each in another order; only the box and the backlash differ.`
          }
        >
          {moduleWords(option.stages)}
          {order && ` · ${orderWords(order)}`}
        </Box>
      </TableCell>
      <TableCell align="right" title={`Exactly ${exactRatioWords(option.ratio)}`}>
        {ratioWords(option.ratio.value)}
      </TableCell>
      <TableCell align="right">{errorWords(option.ratio.errorPercent)}</TableCell>
      <TableCell align="right">{formatNumber(option.centreDistanceSum, 2)}</TableCell>
      <TableCell align="right">{boxWords(option.box)}</TableCell>
      <TableCell align="right">{formatNumber(option.mass, 2)}</TableCell>
      <TableCell align="right">{leastContactWords(option)}</TableCell>
      <TableCell align="right">{formatNumber(option.backlashArcmin, 1)}</TableCell>
      {supply && (
        <>
          <CostCell supply={supply.byOption.get(option.key)} loading={supply.loading} />
          <StockCell supply={supply.byOption.get(option.key)} loading={supply.loading} />
        </>
      )}
    </TableRow>
  );
}
