import Delete from '@mui/icons-material/DeleteOutlined';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import IconButton from '@mui/material/IconButton';
import Typography from '@mui/material/Typography';
import { useRef, type KeyboardEvent } from 'react';
import { flushSync } from 'react-dom';
import { useFieldArray, useWatch, type UseFormReturn } from 'react-hook-form';
import { priceUnitWords } from '../../components/offers/offerWords';
import { BreakCell } from './BreakCell';
import { breakPriceProblem, breakQuantityProblem, MOST_BREAKS } from './breakProblem';
import { BLANK_BREAK, type OfferForm } from './offerForm';
import type { Offer } from '../../api/types';

interface BreakEditorProps {
  form: UseFormReturn<OfferForm>;
  /** The part's unit: `pcs` or `l`. */
  unit: string;
}

/**
 * From which quantity which price holds, a row each. Enter in a row goes on to the next one, or starts it; Backspace in
 * a row that is blank takes it away.
 */
export function BreakEditor({ form, unit }: BreakEditorProps) {
  const { control, getValues } = form;
  const rows = useRef<HTMLDivElement>(null);
  const { fields, append, remove } = useFieldArray({ control, name: 'breaks' });
  const currency = useWatch({ control, name: 'currency' });
  const per = useWatch({ control, name: 'per' });
  const full = fields.length >= MOST_BREAKS;

  const focus = (index: number, cell: 'quantity' | 'price') =>
    rows.current?.querySelector<HTMLInputElement>(`[name="breaks.${index}.${cell}"]`)?.focus();
  // The row is there before the next key is pressed, however fast somebody types.
  const add = () => {
    flushSync(() => append(BLANK_BREAK, { shouldFocus: false }));
    focus(fields.length, 'quantity');
  };
  const drop = (index: number) => {
    flushSync(() => remove(index));
    focus(Math.max(0, index - 1), 'price');
  };
  const onKey = (event: KeyboardEvent, index: number, cell: 'quantity' | 'price') => {
    const row = getValues(`breaks.${index}`);
    if (event.key === 'Enter' && !event.ctrlKey && !event.metaKey) {
      // Enter alone would send the form.
      event.preventDefault();
      if (cell === 'quantity') focus(index, 'price');
      else if (index + 1 < fields.length) focus(index + 1, 'quantity');
      else if (!full && row.quantity.trim() !== '') add();
    } else if (event.key === 'Backspace' && row.quantity === '' && row.price === '' && fields.length > 1) {
      event.preventDefault();
      drop(index);
    }
  };

  return (
    <Box ref={rows} role="group" aria-label="Price breaks">
      <Box sx={{ ...gridSx, mb: 0.5 }} aria-hidden="true">
        <Typography variant="body2" color="textSecondary">
          From quantity, {unit}
        </Typography>
        <Typography variant="body2" color="textSecondary">
          Price, {priceUnitWords({ currency, per: Number(per) as Offer['per'] })}
        </Typography>
      </Box>
      {fields.map((row, index) => (
        <Box key={row.id} sx={{ ...gridSx, mb: 0.75 }}>
          <BreakCell
            control={control}
            name={`breaks.${index}.quantity`}
            label={`From quantity, row ${index + 1}`}
            check={() => breakQuantityProblem(getValues('breaks'), index)}
            onKeyDown={(event) => onKey(event, index, 'quantity')}
          />
          <BreakCell
            control={control}
            name={`breaks.${index}.price`}
            label={`Price, row ${index + 1}`}
            check={() => breakPriceProblem(getValues('breaks'), index, getValues('currency'))}
            onKeyDown={(event) => onKey(event, index, 'price')}
          />
          <IconButton
            aria-label={`Remove the price in row ${index + 1}`}
            disabled={fields.length === 1}
            onClick={() => drop(index)}
          >
            <Delete fontSize="small" />
          </IconButton>
        </Box>
      ))}
      <Box sx={{ display: 'flex', alignItems: 'center', gap: 1.5, flexWrap: 'wrap' }}>
        <Button variant="outlined" disabled={full} onClick={add}>
          Add a price break
        </Button>
        <Typography variant="body2" color="textSecondary">
          {full
            ? `An offer has at most ${MOST_BREAKS} price breaks.`
            : 'Enter goes to the next row; Backspace in a blank row removes it.'}
        </Typography>
      </Box>
    </Box>
  );
}

const gridSx = {
  display: 'grid',
  gridTemplateColumns: 'minmax(90px, 150px) minmax(110px, 170px) 34px',
  gap: 1,
  alignItems: 'start',
} as const;
