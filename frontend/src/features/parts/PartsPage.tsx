import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useTheme } from '@mui/material/styles';
import useMediaQuery from '@mui/material/useMediaQuery';
import { useMemo } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { useParts } from '../../api/hooks/useParts';
import type { PartSummary } from '../../api/types';
import { DataTable } from '../../components/DataTable';
import { EmptyState } from '../../components/EmptyState';
import { formatCount } from '../../components/figures';
import { PageHeader } from '../../components/PageHeader';
import { useListState } from '../../components/useListState';
import { attributeOf, figureOf } from './attributes';
import { columnsFor, hiddenColumns, type TableWidth } from './partColumns';
import { PART_FILTERS, PART_SORTS, partQuery } from './partFilters';
import { PartsFilterBar } from './PartsFilterBar';

const COPY_HEAD = [
  'Number',
  'Description',
  'Kind',
  'Teeth',
  'Module mm',
  'Helix deg',
  'Hand',
  'Face mm',
  'Bore mm',
  'Material',
  'Mass kg',
  'Shelf',
  'Unit',
  'Standing',
];

/** A copied figure keeps a plain point and minus, so that a spreadsheet reads it as a number. */
function copyRow(part: PartSummary): (string | number | null)[] {
  const hand = attributeOf(part, 'hand');
  return [
    part.number,
    part.description,
    part.kind,
    ...['teeth', 'module', 'helixAngleDeg'].map((name) => figureOf(part, name)),
    typeof hand === 'string' ? hand : null,
    ...['faceWidth', 'bore'].map((name) => figureOf(part, name)),
    part.material,
    part.mass,
    part.shelf,
    part.unit,
    part.standing,
  ];
}

export default function PartsPage() {
  const navigate = useNavigate();
  const theme = useTheme();
  const narrow = useMediaQuery(theme.breakpoints.down('sm'));
  const wide = useMediaQuery('(min-width: 1400px)');
  const full = useMediaQuery('(min-width: 1700px)');
  const width: TableWidth = narrow ? 'narrow' : full ? 'full' : wide ? 'wide' : 'middle';
  const { can } = useMe();
  const state = useListState(PART_FILTERS, PART_SORTS);
  const query = useMemo(() => partQuery(state), [state]);
  const { page, problem, isLoading, mutate } = useParts(query);

  const add = can('parts.edit') ? (
    <Button variant="contained" component={Link} to="/add-part">
      Add part
    </Button>
  ) : undefined;
  const filtered = state.filterCount > 0;
  return (
    <Box sx={pageSx}>
      <PageHeader title="Parts" actions={add} />
      <PartsFilterBar
        state={state}
        result={
          page === undefined ? undefined : `${formatCount(page.total)} ${page.total === 1 ? 'part' : 'parts'}`
        }
      />
      <Box sx={{ flex: '1 1 0', minHeight: 380 }}>
        <DataTable<PartSummary>
          label="Parts"
          height="100%"
          rowHeight={narrow ? 48 : 32}
          columns={columnsFor(width)}
          rows={page?.items}
          total={page?.total}
          getRowId={(part) => part.id}
          state={state}
          loading={isLoading}
          problem={problem}
          onRetry={() => void mutate()}
          onOpen={(part) => void navigate(`/parts/${encodeURIComponent(part.number)}`)}
          copied={(parts) => [COPY_HEAD, ...parts.map(copyRow)]}
          hidden={hiddenColumns(width)}
          empty={
            filtered ? (
              <EmptyState
                title="No part meets these filters"
                action={
                  <Button variant="outlined" onClick={state.clearFilters}>
                    Clear the filters
                  </Button>
                }
              >
                Loosen one of them, or clear them all.
              </EmptyState>
            ) : (
              <EmptyState title="The library is empty" action={add}>
                {can('parts.edit')
                  ? 'Add the gears, bearings and other parts that you hold or can buy.'
                  : 'A librarian adds the gears, bearings and other parts.'}
              </EmptyState>
            )
          }
        />
      </Box>
    </Box>
  );
}

/** The table takes what the filters leave of the window, however many lines they need. */
const pageSx = { display: 'flex', flexDirection: 'column', minHeight: 'calc(100dvh - 92px)' } as const;
