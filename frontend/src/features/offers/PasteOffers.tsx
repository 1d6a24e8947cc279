import Box from '@mui/material/Box';
import TextField from '@mui/material/TextField';
import { useState } from 'react';
import { bookOffers, previewOffers } from '../../api/hooks/useOfferPaste';
import { readOffersAgain } from '../../api/hooks/useOffer';
import { formatDay } from '../../components/figures';
import { PasteDialog } from '../../components/paste/PasteDialog';
import { SupplierPicker } from '../../components/SupplierPicker';
import { todayIso } from '../../components/today';
import { OFFER_COLUMNS_HELP } from './pasteHelp';

interface PasteOffersProps {
  /** Code of the supplier to begin with; blank: to be chosen. */
  supplier: string;
  onClose: () => void;
}

/** `3 offers added`, `1 offer changed` */
const counted = (count: number, what: string): string =>
  `${count} ${count === 1 ? 'offer' : 'offers'} ${what}`;

function bookedWords({
  added,
  changed,
  leftOut,
}: {
  added: number;
  changed: number;
  leftOut: number;
}): string {
  const parts = [
    ...(added > 0 ? [counted(added, 'added')] : []),
    ...(changed > 0 ? [counted(changed, 'changed')] : []),
    ...(leftOut > 0 ? [`${leftOut} ${leftOut === 1 ? 'row' : 'rows'} left out`] : []),
  ];
  return `${parts.join(', ') || 'Nothing changed'}.`;
}

/** Rows of a supplier's price list from a spreadsheet into offers. */
export function PasteOffers({ supplier, onClose }: PasteOffersProps) {
  const [code, setCode] = useState(supplier);
  const [pricedOn, setPricedOn] = useState(todayIso());
  const [validUntil, setValidUntil] = useState('');
  const [source, setSource] = useState('');
  const defaults = {
    pricedOn,
    ...(validUntil === '' ? {} : { validUntil }),
    ...(source.trim() === '' ? {} : { source: source.trim() }),
  };
  const ends = validUntil !== '' && validUntil < todayIso();
  return (
    <PasteDialog
      title="Paste offers of a supplier"
      columnsHelp={OFFER_COLUMNS_HELP}
      settingsKey={JSON.stringify([code, defaults])}
      notYet={
        code === ''
          ? 'Choose the supplier first.'
          : pricedOn === ''
            ? 'Say on which day they stated the prices.'
            : null
      }
      settings={
        <Box sx={settingsSx}>
          <SupplierPicker
            code={code}
            required
            autoFocus={code === ''}
            onPick={(picked) => setCode(picked?.code ?? '')}
          />
          <TextField
            type="date"
            label="Priced on"
            required
            value={pricedOn}
            onChange={(event) => setPricedOn(event.target.value)}
            helperText={
              pricedOn === ''
                ? 'For rows that name no day'
                : `${formatDay(pricedOn)}, for rows that name no day`
            }
          />
          <TextField
            type="date"
            label="Valid until"
            value={validUntil}
            onChange={(event) => setValidUntil(event.target.value)}
            error={ends}
            helperText={
              ends
                ? 'This day is past already.'
                : validUntil === ''
                  ? 'Blank: until further notice'
                  : formatDay(validUntil)
            }
          />
          <TextField
            label="Source"
            value={source}
            onChange={(event) => setSource(event.target.value)}
            helperText="A quotation’s number, a price list"
            slotProps={{ htmlInput: { maxLength: 200 } }}
          />
        </Box>
      }
      preview={(text) => previewOffers({ text, supplierCode: code, defaults })}
      book={async (text, token, leaveOutWrong) =>
        bookedWords(await bookOffers({ text, supplierCode: code, defaults, token, leaveOutWrong }))
      }
      onBooked={readOffersAgain}
      onClose={onClose}
    />
  );
}

const settingsSx = {
  display: 'grid',
  gridTemplateColumns: { xs: '1fr 1fr', md: '1.6fr 1fr 1fr 1.4fr' },
  columnGap: 1.5,
  rowGap: 1,
  alignItems: 'start',
} as const;
