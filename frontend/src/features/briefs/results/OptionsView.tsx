import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import ToggleButton from '@mui/material/ToggleButton';
import ToggleButtonGroup from '@mui/material/ToggleButtonGroup';
import Typography from '@mui/material/Typography';
import { useMemo } from 'react';
import { pinOption, unpinOption } from '../../../api/hooks/usePins';
import { asProblem } from '../../../api/problem';
import type { Brief, Search, TrainOption, WhyNot } from '../../../api/types';
import { Cautions } from '../../../components/Cautions';
import { EmptyState } from '../../../components/EmptyState';
import { useNotices } from '../../../components/Notices';
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
  const shown = orderedOptions(all, view.stages, view.order);
  const pinned = useMemo(() => new Set(brief.pins.map(({ key }) => key)), [brief.pins]);

  async function pin(option: TrainOption, on: boolean): Promise<void> {
    try {
      await (on ? pinOption(brief, option, search.id) : unpinOption(brief, option.key));
    } catch (error) {
      tell(asProblem(error).message);
    }
  }

  return (
    <Box
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: 'minmax(0, 1fr)', lg: 'minmax(0, 1fr) 236px', xl: 'minmax(0, 1fr) 280px' },
        columnGap: 2,
        rowGap: 2,
        alignItems: 'start',
      }}
    >
      <Box sx={{ minWidth: 0 }}>
        {all.length === 0 ? (
          <>
            <OutcomeLine search={search} shown={0} />
            <Box sx={{ bgcolor: 'background.paper', border: '1px solid', borderColor: 'line.rule', mt: 1 }}>
              {search.outcome?.search.complete ? (
                <EmptyState title="No option">{reasonsWords(search.outcome.whyNot.length > 0)}</EmptyState>
              ) : (
                <EmptyState title="Nothing found before it stopped">
                  Search again and let it run longer, or narrow the brief: fewer teeth to try, fewer stages.
                </EmptyState>
              )}
            </Box>
          </>
        ) : (
          <OptionTable
            options={shown}
            allOptions={all}
            pinned={pinned}
            onPin={canEdit ? (option, on) => void pin(option, on) : undefined}
            order={view.order}
            onSort={view.sortBy}
            toolbar={(copy, selected) => (
              <Box
                sx={{
                  display: 'flex',
                  flexWrap: 'wrap',
                  alignItems: 'center',
                  columnGap: 2,
                  rowGap: 0.5,
                  mb: 0.5,
                }}
              >
                <OutcomeLine search={search} shown={shown.length} />
                <StageFilter options={all} chosen={view.stages} onChoose={view.setStages} />
                <Button variant="text" onClick={copy} sx={{ fontWeight: 500, minHeight: 28, py: 0 }}>
                  {selected > 0 ? `Copy ${selected} selected` : 'Copy table'}
                </Button>
              </Box>
            )}
          />
        )}
        <PinnedBar brief={brief} canAdopt={canAdopt} />
      </Box>
      <Box component="aside" aria-label="About these options" sx={{ display: 'grid', rowGap: 1.5 }}>
        <WhyNotPanel whyNot={search.outcome?.whyNot ?? []} onTry={canEdit ? onTry : undefined} />
        <Cautions short />
      </Box>
    </Box>
  );
}

function reasonsWords(known: boolean): string {
  return known
    ? 'The reasons stand beside this. Each names the limit in the way and the least change that would let an option in.'
    : 'The search was stopped before the reasons were worked out. Search again to see them.';
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
    <Box sx={{ display: 'flex', alignItems: 'center', gap: 1 }}>
      <Typography component="span" color="textSecondary" id="stage-filter">
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
