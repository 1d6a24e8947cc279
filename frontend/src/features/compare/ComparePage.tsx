import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import FormControlLabel from '@mui/material/FormControlLabel';
import Switch from '@mui/material/Switch';
import ToggleButton from '@mui/material/ToggleButton';
import Typography from '@mui/material/Typography';
import { useMemo, useState } from 'react';
import { Link, useParams, useSearchParams } from 'react-router-dom';
import { useBrief } from '../../api/hooks/useBrief';
import { useBriefSearch } from '../../api/hooks/useBriefSearch';
import { useMe } from '../../api/hooks/useMe';
import { unpinOption } from '../../api/hooks/usePins';
import { supplyByOption, useSearchSupply } from '../../api/hooks/useSearchSupply';
import { asProblem } from '../../api/problem';
import type { Brief, Pin } from '../../api/types';
import { AdoptDialog } from '../../components/AdoptDialog';
import { Cautions } from '../../components/Cautions';
import { EmptyState } from '../../components/EmptyState';
import { ErrorState } from '../../components/ErrorState';
import { LoadingRows } from '../../components/LoadingRows';
import { useNotices } from '../../components/Notices';
import { teethWords } from '../../components/optionWords';
import { PageHeader } from '../../components/PageHeader';
import { Sheet } from '../../components/Sheet';
import { CompareTable } from './CompareTable';
import { fewerAgainstMore } from './sentences';
import { MOST_SHOWN, shownPins, toggledPins } from './shownPins';

/** `/briefs/:id/compare`: the pinned options of a brief, up to four, side by side. */
export default function ComparePage() {
  const { id = '' } = useParams();
  const { data: brief, error, mutate } = useBrief(id);
  if (brief) return <Compare brief={brief} />;
  if (error === undefined) return <LoadingRows rows={12} label="Loading the pinned options" />;
  return <ErrorState problem={asProblem(error)} what="the pinned options" onRetry={() => void mutate()} />;
}

function Compare({ brief }: { brief: Brief }) {
  const [params, setParams] = useSearchParams();
  const { can } = useMe();
  const { tell } = useNotices();
  const [adopting, setAdopting] = useState<Pin | null>(null);
  const { data: search } = useBriefSearch(brief.latestSearch?.id ?? null);
  const quantity = can('prices.read') ? (brief.requirement.buildQuantity ?? null) : null;
  const { data: supplied } = useSearchSupply(brief.latestSearch?.id ?? null, quantity);
  const supply = useMemo(
    () => supplied && { quantity: supplied.quantity, byOption: supplyByOption(supplied) },
    [supplied],
  );
  const shown = shownPins(brief.pins, params.get('show'));
  const differencesOnly = params.has('differences');
  const home = `/briefs/${encodeURIComponent(brief.id)}`;

  const set = (name: string, value: string | null) =>
    setParams(
      (before) => {
        const after = new URLSearchParams(before);
        if (value === null) after.delete(name);
        else after.set(name, value);
        return after;
      },
      { replace: true, preventScrollReset: true },
    );

  async function unpin(pin: Pin): Promise<void> {
    try {
      await unpinOption(brief, pin.key);
      tell(`${teethWords(pin.option.stages)} is no longer pinned.`);
    } catch (refusal) {
      tell(asProblem(refusal).message);
    }
  }

  const sentences = fewerAgainstMore(
    shown.map(({ option }) => option),
    search?.outcome?.whyNot ?? [],
  );
  return (
    <>
      <PageHeader
        title={brief.title}
        code={brief.code}
        facts={`${shown.length === 1 ? 'One pinned option' : `${shown.length} pinned options side by side`}`}
        actions={
          <Box sx={{ display: 'flex', gap: 1, displayPrint: 'none' }}>
            <Button variant="outlined" component={Link} to={home}>
              Back to the options
            </Button>
            {shown.length > 0 && (
              <Button variant="outlined" onClick={() => window.print()}>
                Print
              </Button>
            )}
          </Box>
        }
      />
      {shown.length === 0 ? (
        <Sheet>
          <EmptyState
            title="Nothing pinned yet"
            action={
              <Button variant="contained" component={Link} to={home}>
                To the options
              </Button>
            }
          >
            Tick an option in the table of this brief to pin it; up to four pinned options stand here side by
            side.
          </EmptyState>
        </Sheet>
      ) : (
        <>
          <Box
            sx={{
              display: 'flex',
              flexWrap: 'wrap',
              alignItems: 'center',
              gap: 1,
              mb: 1,
              displayPrint: 'none',
            }}
          >
            {brief.pins.length > MOST_SHOWN && (
              <PinChoice
                pins={brief.pins}
                shown={shown}
                onToggle={(pin) => set('show', toggledPins(shown, pin))}
              />
            )}
            {shown.length > 1 && (
              <FormControlLabel
                control={
                  <Switch
                    size="small"
                    checked={differencesOnly}
                    onChange={(_, on) => set('differences', on ? '1' : null)}
                  />
                }
                label="Differences only"
                sx={{ ml: 0 }}
              />
            )}
          </Box>
          <CompareTable
            pins={shown}
            differencesOnly={differencesOnly && shown.length > 1}
            supply={supply}
            onAdopt={can('trains.edit') ? setAdopting : undefined}
            onUnpin={can('briefs.edit') ? (pin) => void unpin(pin) : undefined}
          />
          {sentences.length > 0 && (
            <Box component="section" aria-labelledby="fewer-more" sx={{ mt: 2, maxWidth: 820 }}>
              <Typography variant="h2" id="fewer-more">
                Fewer stages against more
              </Typography>
              {sentences.map((sentence) => (
                <Typography key={sentence} sx={{ mt: 0.5 }}>
                  {sentence}
                </Typography>
              ))}
            </Box>
          )}
          <Cautions />
        </>
      )}
      {adopting && <AdoptDialog brief={brief} pins={[adopting]} onClose={() => setAdopting(null)} />}
    </>
  );
}

interface PinChoiceProps {
  pins: readonly Pin[];
  shown: readonly Pin[];
  onToggle: (pin: Pin) => void;
}

/** With more pins than columns: which four to show. */
function PinChoice({ pins, shown, onToggle }: PinChoiceProps) {
  return (
    <Box role="group" aria-label="Options shown" sx={{ display: 'flex', flexWrap: 'wrap', gap: 0.5 }}>
      {pins.map((pin) => (
        <ToggleButton
          key={pin.key}
          value={pin.key}
          size="small"
          selected={shown.includes(pin)}
          onChange={() => onToggle(pin)}
        >
          {teethWords(pin.option.stages)}
        </ToggleButton>
      ))}
    </Box>
  );
}
