import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Link from '@mui/material/Link';
import { useEffect, useMemo, useState, useSyncExternalStore } from 'react';
import { Link as RouterLink } from 'react-router-dom';
import { EmptyState } from '../../../components/EmptyState';
import { PageHeader } from '../../../components/PageHeader';
import { newRequestKey } from '../../../components/stock/requestKey';
import { Sheet } from '../../../components/Sheet';
import { CountEntry } from './CountEntry';
import { CountRows } from './CountRows';
import { unsettled, waiting, type Count } from './countTypes';
import { PlaceStep } from './PlaceStep';
import { added, finished, sentAgain, without } from './roundChanges';
import { roundStore } from './roundStore';
import { keepShelf } from './shelfCache';
import { UnsentWarning } from './UnsentWarning';
import { useSending } from './useSending';

/** One round of counting: a place, one part after the other, and below what was counted. */
export function CountRoundView({ userId }: { userId: string }) {
  const store = useMemo(() => roundStore(userId), [userId]);
  const round = useSyncExternalStore(store.subscribe, store.get);
  const [choosing, setChoosing] = useState(false);
  const [again, setAgain] = useState({ number: '', times: 0 });
  const unsent = waiting(round).length;
  const { away, tryAgain } = useSending(store, unsent);
  const { place } = round;
  useEffect(() => {
    // Looking parts up without a network is a help, not a need.
    if (place !== '') void keepShelf(place).catch(() => undefined);
  }, [place]);

  const choose = (chosen: string) => {
    store.change((before) => ({ ...before, place: chosen }));
    setChoosing(false);
  };
  const countAgain = ({ key, number, place: there }: Count) => {
    store.change((before) => ({ ...without(before, key), place: there }));
    setAgain(({ times }) => ({ number, times: times + 1 }));
  };
  const isAtPlace = place !== '' && !choosing;
  return (
    <Box sx={{ maxWidth: 560, mx: 'auto' }}>
      <PageHeader
        title={isAtPlace ? `Count ${place}` : 'Count'}
        actions={
          isAtPlace ? (
            <Button variant="outlined" sx={{ minHeight: 44 }} onClick={() => setChoosing(true)}>
              Other place
            </Button>
          ) : undefined
        }
      />
      {unsent > 0 && away && (
        <Alert
          severity="info"
          sx={{ mb: 2 }}
          action={
            <Button color="inherit" onClick={tryAgain}>
              Send now
            </Button>
          }
        >
          {unsent === 1 ? 'One count waits' : `${unsent} counts wait`} for the network. Go on counting.
        </Alert>
      )}
      {!store.isKept() && (
        <Alert severity="warning" sx={{ mb: 2 }}>
          This browser keeps nothing on the device. Counts are lost if you close the page before they are
          sent.
        </Alert>
      )}
      {isAtPlace ? (
        <CountEntry
          key={`${place} ${again.times}`}
          place={place}
          start={again.number}
          onCount={(count) => store.change((before) => added(before, count))}
        />
      ) : (
        <PlaceStep start="" onChoose={choose} />
      )}
      <Sheet
        title="Counted in this round"
        flush
        sx={{ mt: 2 }}
        aside={
          round.counts.some(({ state }) => state === 'sent') ? (
            <Button onClick={() => store.change(finished)}>Clear what is booked</Button>
          ) : null
        }
      >
        {round.counts.length > 0 ? (
          <CountRows
            counts={round.counts}
            onRemove={({ key }) => store.change((before) => without(before, key))}
            onAgain={countAgain}
            onSendAgain={({ key }) => store.change((before) => sentAgain(before, key, newRequestKey()))}
          />
        ) : (
          <EmptyState title="Nothing yet">
            Scan or type a part number, then what is there. What the books say is shown after your figure, so
            that it cannot lead you. Without a network counts stay on this device until it is back.
          </EmptyState>
        )}
      </Sheet>
      <Box sx={{ mt: 2 }}>
        <Link component={RouterLink} to="/stock">
          What lies on the shelf
        </Link>
      </Box>
      <UnsentWarning count={unsettled(round).length} />
    </Box>
  );
}
