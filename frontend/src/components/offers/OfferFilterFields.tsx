import Tune from '@mui/icons-material/Tune';
import Button from '@mui/material/Button';
import FormControlLabel from '@mui/material/FormControlLabel';
import Switch from '@mui/material/Switch';
import { useState, type ReactNode } from 'react';
import { CURRENCY_CHOICES } from '../currencyChoices';
import { ChoiceFilter } from '../FilterFields';
import type { ListState } from '../useListState';
import { ENDS_CHOICES, STATE_CHOICES, type OfferFilter } from './offerFilters';

interface OfferFilterFieldsProps {
  state: ListState<OfferFilter>;
  /** A phone: the filters fold away until one of them is set. */
  narrow: boolean;
  /** Filters that only the whole list has. */
  more: ReactNode;
}

/** The filters of the offers but their text. */
export function OfferFilterFields({
  state: { filters, filterCount, setFilters },
  narrow,
  more,
}: OfferFilterFieldsProps) {
  const [open, setOpen] = useState(false);
  const set = filterCount > (filters.text === undefined ? 0 : 1);
  if (narrow && !open && !set) {
    return (
      <Button startIcon={<Tune />} aria-expanded={false} onClick={() => setOpen(true)}>
        Filters
      </Button>
    );
  }
  return (
    <>
      {more}
      <ChoiceFilter
        label="State"
        width={108}
        value={filters.state ?? ''}
        onSet={(value) => setFilters({ state: value })}
        choices={STATE_CHOICES}
      />
      <ChoiceFilter
        label="Ends"
        width={124}
        value={filters.ends ?? ''}
        onSet={(ends) => setFilters({ ends })}
        choices={ENDS_CHOICES}
      />
      <ChoiceFilter
        label="Currency"
        width={104}
        value={filters.currency ?? ''}
        onSet={(currency) => setFilters({ currency })}
        choices={CURRENCY_CHOICES}
      />
      <FormControlLabel
        control={
          <Switch
            size="small"
            checked={filters.tooOld === 'true'}
            onChange={(_, on) => setFilters({ tooOld: on ? 'true' : '' })}
          />
        }
        label="Price too old"
        sx={{ minHeight: 34, ml: 0.5 }}
      />
    </>
  );
}
