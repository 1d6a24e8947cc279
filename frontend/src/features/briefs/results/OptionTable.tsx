import ArrowDownward from '@mui/icons-material/ArrowDownward';
import ArrowUpward from '@mui/icons-material/ArrowUpward';
import Box from '@mui/material/Box';
import ButtonBase from '@mui/material/ButtonBase';
import Table from '@mui/material/Table';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import Button from '@mui/material/Button';
import { useMemo, useState, type ReactNode } from 'react';
import type { TrainOption } from '../../../api/types';
import { formatCount } from '../../../components/figures';
import { currenciesOf } from '../../../components/supplyWords';
import { useRowSelection } from '../../../components/useRowSelection';
import { commonScale } from '../../../drawings/TrainStrip';
import { OptionTableRow, STRIP } from './OptionTableRow';
import type { OptionOrder, OptionSort } from './optionOrder';
import { OPTION_HEADS, optionRow, supplyCells, supplyHeads } from './optionRows';
import { stageOrders } from './stageOrders';
import type { ShownSupply } from './SupplyCells';

interface OptionTableProps {
  options: readonly TrainOption[];
  /** Every option of the search: the strips' common scale does not change with the filter. */
  allOptions: readonly TrainOption[];
  pinned: ReadonlySet<string>;
  /** Left out for people who may not pin. */
  onPin?: (option: TrainOption, pin: boolean) => void;
  order: OptionOrder | null;
  onSort: (by: OptionSort) => void;
  /** Left out where the brief names no build quantity, and for people who do not see prices. */
  supply?: ShownSupply;
  /** Puts the table in its place, with what copies it. */
  frame: (table: ReactNode, copy: () => void, selected: number) => ReactNode;
}

interface Head {
  text: string;
  unit?: string;
  /** What a sign is called, where the unit is one. */
  unitName?: string;
  sort?: OptionSort;
  left?: boolean;
}

const HEADS: Head[] = [
  { text: 'Train, one scale', sort: 'stages', left: true },
  { text: 'Teeth, module', left: true },
  { text: 'Ratio', sort: 'ratio' },
  { text: 'Error', unit: '%', sort: 'error' },
  { text: 'Centres', unit: 'mm', sort: 'centres' },
  { text: 'Box', unit: 'mm', sort: 'box' },
  { text: 'Mass', unit: 'kg', sort: 'mass' },
  { text: 'Contact', sort: 'contact' },
  { text: 'Backlash', unit: '′', unitName: 'arc minutes', sort: 'backlash' },
];

const supplyColumns = (quantity: number): Head[] => [
  { text: 'Cost', unit: `for ${formatCount(quantity)}`, sort: 'cost' },
  { text: 'Stock', sort: 'stock', left: true },
];

/** Rows drawn before the reader asks for more: the drawings of thousands would stall the page. */
const DRAWN_AT_ONCE = 200;

/** The options, one row each, with the train drawn on one scale. Arrows move, Space pins, Ctrl+C copies. */
export function OptionTable(props: OptionTableProps) {
  const { options, pinned, onPin, order, onSort, supply } = props;
  const [room, setRoom] = useState(DRAWN_AT_ONCE);
  const drawn = options.slice(0, room);
  const currencies = useMemo(() => currenciesOf(supply?.byOption.values() ?? []), [supply?.byOption]);
  const { body, rowProps, copy, selected } = useRowSelection({
    rows: drawn.length,
    allRows: options.length,
    heads: supply ? [...OPTION_HEADS, ...supplyHeads(supply.quantity, currencies)] : OPTION_HEADS,
    cellsOf: (row) => {
      const option = options[row];
      if (!option) return [];
      return supply
        ? [...optionRow(option), ...supplyCells(supply.byOption.get(option.key), currencies)]
        : optionRow(option);
    },
    onSpace: (row) => {
      const option = options[row];
      if (option) onPin?.(option, !pinned.has(option.key));
    },
  });
  const { allOptions } = props;
  const scale = useMemo(() => commonScale(allOptions, STRIP.height, STRIP.width), [allOptions]);
  const orders = useMemo(() => stageOrders(allOptions), [allOptions]);
  const table = (
    <Box
      sx={{
        bgcolor: 'background.paper',
        overflowX: 'auto',
        minWidth: 0,
        // An upright A4 sheet then holds every column.
        '@media print': { zoom: supply ? 0.66 : 0.84 },
      }}
    >
      <Table
        role="grid"
        aria-label="Options"
        aria-multiselectable
        sx={{ '& .MuiTableCell-root': { py: 0, px: 0.75, fontSize: '0.8125rem', whiteSpace: 'nowrap' } }}
      >
        <TableHead>
          <TableRow sx={{ height: 26 }}>
            <TableCell scope="col" sx={{ width: 34 }}>
              Pin
            </TableCell>
            {[...HEADS, ...(supply ? supplyColumns(supply.quantity) : [])].map((head) => (
              <HeadCell key={head.text} head={head} order={order} onSort={onSort} />
            ))}
          </TableRow>
        </TableHead>
        <TableBody ref={body}>
          {drawn.map((option, row) => (
            <OptionTableRow
              key={option.key}
              option={option}
              scale={scale}
              order={orders.get(option.key)}
              pinned={pinned.has(option.key)}
              onPin={onPin}
              supply={supply}
              rowProps={rowProps(row)}
            />
          ))}
        </TableBody>
      </Table>
      {drawn.length < options.length && (
        <Button variant="text" onClick={() => setRoom(room + DRAWN_AT_ONCE)} sx={{ m: 0.5 }}>
          {`Show more; ${options.length - drawn.length} options are not shown yet`}
        </Button>
      )}
    </Box>
  );
  return props.frame(table, () => void copy(), selected.size);
}

function HeadCell({
  head,
  order,
  onSort,
}: { head: Head; order: OptionOrder | null } & Pick<OptionTableProps, 'onSort'>) {
  const { text, unit, unitName, sort, left } = head;
  const current = sort !== undefined && order?.by === sort ? order : null;
  const label = (
    <>
      {text}
      {unit && (
        <Box component="span" title={unitName} sx={{ ml: 0.5 }}>
          {unit}
        </Box>
      )}
    </>
  );
  const Arrow = current?.down ? ArrowDownward : ArrowUpward;
  return (
    <TableCell
      scope="col"
      align={left ? 'left' : 'right'}
      aria-sort={current ? (current.down ? 'descending' : 'ascending') : undefined}
    >
      {sort === undefined ? (
        label
      ) : (
        <ButtonBase
          onClick={() => onSort(sort)}
          sx={{
            font: 'inherit',
            color: current ? 'text.primary' : 'inherit',
            fontWeight: current ? 600 : 500,
          }}
        >
          {current && <Arrow aria-hidden sx={{ fontSize: 14, mr: 0.25 }} />}
          {label}
        </ButtonBase>
      )}
    </TableCell>
  );
}
