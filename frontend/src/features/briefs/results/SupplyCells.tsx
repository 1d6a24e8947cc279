import Box from '@mui/material/Box';
import ButtonBase from '@mui/material/ButtonBase';
import TableCell from '@mui/material/TableCell';
import Tooltip from '@mui/material/Tooltip';
import type { SupplyByOption } from '../../../api/hooks/useSearchSupply';
import type { OptionSupply } from '../../../api/types';
import { NOTHING } from '../../../components/figures';
import {
  allCostWords,
  firstCostWords,
  pricedWords,
  shelfWords,
  toMakeWords,
} from '../../../components/supplyWords';

/** Cost and stock at the build quantity that the brief names. */
export interface ShownSupply {
  quantity: number;
  /** Empty until the answer has come. */
  byOption: SupplyByOption;
  loading: boolean;
}

interface SupplyCellProps {
  supply: OptionSupply | undefined;
  loading: boolean;
}

const small = { color: 'text.secondary', fontSize: '0.6875rem' } as const;

/** What the gears cost: the first currency, the others on request, and how much of it is priced. */
export function CostCell({ supply, loading }: SupplyCellProps) {
  if (!supply) return <Unknown loading={loading} align="right" />;
  const first = firstCostWords(supply);
  const others = supply.costs.length - 1;
  return (
    <TableCell align="right" sx={{ lineHeight: 1.25 }}>
      {first === null ? (
        <Box component="span" sx={{ color: 'text.secondary' }}>
          not priced
        </Box>
      ) : (
        <>
          <Box sx={{ whiteSpace: 'nowrap' }}>
            {first}
            {others > 0 && (
              <Tooltip title={allCostWords(supply)}>
                <ButtonBase
                  aria-label={`In all ${allCostWords(supply)}`}
                  sx={{ font: 'inherit', ml: 0.5, color: 'secondary.main', fontWeight: 600 }}
                >
                  {`+${others}`}
                </ButtonBase>
              </Tooltip>
            )}
          </Box>
          {supply.unpriced > 0 && (
            <Box sx={{ ...small, color: 'warning.main', fontWeight: 600 }}>{pricedWords(supply)}</Box>
          )}
        </>
      )}
    </TableCell>
  );
}

/** `4 of 6 on the shelf`, and what is to be made. */
export function StockCell({ supply, loading }: SupplyCellProps) {
  if (!supply) return <Unknown loading={loading} align="left" />;
  const toMake = toMakeWords(supply);
  return (
    <TableCell sx={{ lineHeight: 1.25 }}>
      <Box>{shelfWords(supply)}</Box>
      {toMake !== '' && <Box sx={small}>{toMake}</Box>}
    </TableCell>
  );
}

function Unknown({ loading, align }: { loading: boolean; align: 'left' | 'right' }) {
  return (
    <TableCell align={align} sx={{ color: 'text.secondary' }} aria-busy={loading || undefined}>
      {loading ? '…' : NOTHING}
    </TableCell>
  );
}
