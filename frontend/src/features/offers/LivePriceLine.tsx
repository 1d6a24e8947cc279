import Box from '@mui/material/Box';
import TextField from '@mui/material/TextField';
import Typography from '@mui/material/Typography';
import { useDeferredValue, useState } from 'react';
import { useWatch, type Control } from 'react-hook-form';
import { PricedWords } from '../../components/offers/PricedWords';
import { livePrice } from './livePrice';
import type { OfferForm } from './offerForm';

interface LivePriceLineProps {
  control: Control<OfferForm>;
  unit: string;
}

/** Under the breaks: what a quantity would come to with the prices as they are typed. */
export function LivePriceLine({ control, unit }: LivePriceLineProps) {
  const [quantity, setQuantity] = useState('100');
  const [currency, per, breaks, pack, leastQuantity] = useWatch({
    control,
    name: ['currency', 'per', 'breaks', 'pack', 'leastQuantity'],
  });
  const typed = useDeferredValue({ currency, per, breaks, pack, leastQuantity });
  const live = livePrice(typed, quantity);
  return (
    <Box sx={{ display: 'flex', gap: 1.5, alignItems: 'flex-start', flexWrap: 'wrap' }}>
      <TextField
        label={`Try a quantity, ${unit}`}
        value={quantity}
        onChange={(event) => setQuantity(event.target.value)}
        onKeyDown={(event) => {
          // Only tries; Enter here must not save the offer.
          if (event.key === 'Enter') event.preventDefault();
        }}
        autoComplete="off"
        sx={{ width: 150 }}
        slotProps={{ htmlInput: { inputMode: 'decimal', className: 'number', maxLength: 20 } }}
      />
      <Box role="status" sx={{ flex: '1 1 260px', pt: { xs: 0, sm: 3 }, minHeight: 44 }}>
        {live.kind === 'waiting' && (
          <Typography color="textSecondary">
            Give a quantity and a price, and what an order comes to appears here.
          </Typography>
        )}
        {live.kind === 'refused' && <Typography color="error">{live.message}</Typography>}
        {live.kind === 'priced' && <PricedWords price={live.price} unit={unit} />}
      </Box>
    </Box>
  );
}
