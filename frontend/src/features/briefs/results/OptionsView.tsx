import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import ToggleButton from '@mui/material/ToggleButton';
import ToggleButtonGroup from '@mui/material/ToggleButtonGroup';
import Typography from '@mui/material/Typography';
import { useMemo } from 'react';
import { useMe } from '../../../api/hooks/useMe';
import { pinOption, unpinOption } from '../../../api/hooks/usePins';
import { supplyByOption, useSearchSupply } from '../../../api/hooks/useSearchSupply';
import { asProblem } from '../../../api/problem';
import type { Brief, Search, TrainOption, WhyNot } from '../../../api/types';
import { Cautions } from '../../../components/Cautions';
import { EmptyState } from '../../../components/EmptyState';
import { useNotices } from '../../../components/Notices';
import { Sheet } from '../../../components/Sheet';
import { OutcomeLine } from '../search/SearchLine';
import { OptionTable } from './OptionTable';
import { orderedOptions } from './optionOrder';
import { PinnedBar } from './PinnedBar';
import { useOptionView } from './useOptionView';
import { WhyNotPanel } from './WhyNotPanel';

interface OptionsViewProps {
  brief: Brief;
  search: Search;
  canEdit: boolean;
  canAdopt: boolean;
  onTry: (change: NonNullable<WhyNot['relaxed']>) => void;
}

/** What a finished search found: the table, what it can say for itself, and why other counts are out. */
export function OptionsView({ brief, search, canEdit, canAdopt, onTry }: OptionsViewProps) {
  const view = useOptionView();
  const { tell } = useNotices();
  const all = useMemo(() => search.outcome?.options ?? [], [search.outcome]);
  const { can } = useMe();
  const quantity = can('prices.read') ? (brief.requirement.buildQuantity ?? null) : null;
  const answer = useSearchSupply(all.length > 0 ? search.id : null, quantity);
  const byOption = useMemo(() => supplyByOption(answer.data), [answer.data]);
  const supply = quantity === null ? undefined : { quantity, byOption, loading: answer.isLoading };
  const shown = orderedOptions(all, view.stages, view.order, byOption);
  const whyNot = search.outcome?.whyNot ?? [];
  const pinned = useMemo(() => new Set(brief.pins.map(({ key }) => key)), [brief.pins]);

  async function pin(option: TrainOption, on: boolean): Promise<void> {
    try {
      await (on ? pinOption(brief, option, search.id) : unpinOption(brief, option.key));
    } catch (error) {
      tell(asProblem(error).message);
    }
  }

  const aside = (
    <Box component="aside" aria-label="About these options" sx={{ display: 'grid', rowGap: 1.5 }}>
      {all.length > 0 && (
        <WhyNotPanel whyNot={whyNot} request={search.request} onTry={canEdit ? onTry : undefined} />
      )}
      <Cautions short />
    </Box>
  );

  if (all.length === 0) {
    return (
      <>
        <OutcomeLine search={search} shown={0} />
        <Box sx={columns}>
          <Box sx={{ minWidth: 0, mt: 1 }}>
            <NoOption search={search} onTry={canEdit ? onTry : undefined} />
            <PinnedBar brief={brief} canAdopt={canAdopt} />
          </Box>
          {aside}
        </Box>
      </>
    );
  }
  return (
    <OptionTable
      options={shown}
      allOptions={all}
      pinned={pinned}
      onPin={canEdit ? (option, on) => void pin(option, on) : undefined}
      order={view.order}
      onSort={view.sortBy}
      supply={supply}
      frame={(table, copy, selected) => (
        <>
          <Box
            sx={{
              display: 'flex',
              flexWrap: 'wrap',
              alignItems: 'center',
              columnGap: 2,
              rowGap: 0.5,
              mb: 0.5,
              '& .MuiButtonBase-root': { minHeight: 28, py: 0 },
            }}
          >
            <OutcomeLine search={search} shown={shown.length} />
            <StageFilter options={all} chosen={view.stages} onChoose={view.setStages} />
            <Button variant="text" onClick={copy} sx={{ fontWeight: 500, displayPrint: 'none' }}>
              {selected > 0 ? `Copy ${selected} selected` : 'Copy table'}
            </Button>
          </Box>
          {answer.error !== undefined && quantity !== null && (
            <Alert
              severity="warning"
              sx={{ mb: 1 }}
              action={<Button onClick={() => void answer.mutate()}>Try again</Button>}
            >
              Cost and stock could not be loaded. {asProblem(answer.error).message}
            </Alert>
          )}
          <Box sx={supply ? roomyColumns : columns}>
            <Box sx={{ minWidth: 0 }}>
              {table}
              <PinnedBar brief={brief} canAdopt={canAdopt} />
            </Box>
            {aside}
          </Box>
        </>
      )}
    />
  );
}

const columns = {
  display: 'grid',
  gridTemplateColumns: { xs: 'minmax(0, 1fr)', lg: 'minmax(0, 1fr) 236px', xl: 'minmax(0, 1fr) 280px' },
  gap: 2,
  alignItems: 'start',
  '@media print': { gridTemplateColumns: 'minmax(0, 1fr)' },
} as const;

/** With cost and stock the table needs the room; what is said beside it stands below until there is enough. */
const roomyColumns = {
  ...columns,
  gridTemplateColumns: { xs: 'minmax(0, 1fr)', xl: 'minmax(0, 1fr) 280px' },
} as const;

/** Nothing found: the reasons, as wide as the table would be; else what to do next. */
function NoOption({
  search,
  onTry,
}: Pick<OptionsViewProps, 'search'> & Partial<Pick<OptionsViewProps, 'onTry'>>) {
  const whyNot = search.outcome?.whyNot ?? [];
  if (whyNot.length > 0) return <WhyNotPanel whyNot={whyNot} request={search.request} onTry={onTry} />;
  return (
    <Sheet>
      {search.outcome?.search.complete ? (
        <EmptyState title="No option">
          The search was stopped before the reasons were worked out. Search again to see them.
        </EmptyState>
      ) : (
        <EmptyState title="Nothing found before it stopped">
          Search again and let it run longer, or narrow the brief: fewer teeth to try, fewer stages.
        </EmptyState>
      )}
    </Sheet>
  );
}

interface StageFilterProps {
  options: readonly TrainOption[];
  chosen: readonly number[];
  onChoose: (counts: number[]) => void;
}

/** Stage counts as switches; none pressed shows them all. */
function StageFilter({ options, chosen, onChoose }: StageFilterProps) {
  const counts = [...new Set(options.map((option) => option.stages.length))].sort();
  if (counts.length < 2) return null;
  return (
    <Box sx={{ display: 'flex', alignItems: 'center', gap: 1, displayPrint: 'none' }}>
      <Typography component="span" variant="body2" color="textSecondary" id="stage-filter">
        Stages
      </Typography>
      <ToggleButtonGroup
        aria-labelledby="stage-filter"
        size="small"
        value={[...chosen]}
        onChange={(_, next: number[]) => onChoose(next)}
      >
        {counts.map((count) => (
          <ToggleButton key={count} value={count} aria-label={`${count} stages`}>
            {count}
          </ToggleButton>
        ))}
      </ToggleButtonGroup>
    </Box>
  );
}
