import Box from '@mui/material/Box';
import { useWatch, type Control } from 'react-hook-form';
import { ChoiceField } from '../../components/ChoiceField';
import { CurrencyField } from '../../components/CurrencyField';
import { MoneyField } from '../../components/MoneyField';
import { NumberField } from '../../components/NumberField';
import { Sheet } from '../../components/Sheet';
import { TextInput } from '../../components/TextInput';
import { ContactsEditor } from './ContactsEditor';
import { chargesFreight, type SupplierForm } from './supplierForm';
import { FREIGHT_KINDS, FREIGHT_NAMES, LANGUAGE_CHOICES } from './supplierWords';

interface SupplierFormFieldsProps {
  control: Control<SupplierForm>;
  /** Open offers keep their own currency when the supplier's changes; the form says so. */
  openOffers: number;
}

/** All fields of one supplier: who they are, whom to ask, on what terms. */
export function SupplierFormFields({ control, openOffers }: SupplierFormFieldsProps) {
  const currency = useWatch({ control, name: 'currency' });
  const freightKind = useWatch({ control, name: 'freightKind' });
  return (
    <>
      <Sheet title="Who they are">
        <Box sx={gridSx}>
          <Box sx={{ gridColumn: { xs: '1 / -1', sm: 'span 2' } }}>
            <TextInput control={control} name="name" label="Name" required />
          </Box>
          <CurrencyField
            control={control}
            name="currency"
            hint={openOffers > 0 ? 'Offers that are there keep their own' : 'New offers start with it'}
          />
          <ChoiceField
            control={control}
            name="language"
            label="Language"
            choices={LANGUAGE_CHOICES}
            hint="Enquiries are written in it"
          />
          <Box sx={{ gridColumn: '1 / -1' }}>
            <TextInput control={control} name="address" label="Address" rows={3} most={1000} />
          </Box>
        </Box>
      </Sheet>
      <ContactsEditor control={control} />
      <Sheet title="Terms">
        <Box sx={gridSx}>
          <NumberField
            control={control}
            name="leadTimeDays"
            label="Usual lead time"
            unit="days"
            hint="For offers that name none"
            whole
            min={0}
            max={3650}
          />
          <MoneyField
            control={control}
            name="leastOrderValue"
            label="Least order value"
            currency={currency}
            hint="Blank: none"
          />
          <ChoiceField
            control={control}
            name="freightKind"
            label="Freight"
            choices={FREIGHT_KINDS.map((value) => ({ value, name: FREIGHT_NAMES[value] }))}
          />
          {chargesFreight(freightKind) && (
            <MoneyField
              control={control}
              name="freightCharge"
              label="Freight of one order"
              currency={currency}
              required={freightKind === 'flat'}
              hint={freightKind === 'free-from' ? 'Below that value; blank: as charged' : undefined}
            />
          )}
          {freightKind === 'free-from' && (
            <MoneyField
              control={control}
              name="freightFreeFrom"
              label="Free from an order of"
              currency={currency}
              required
            />
          )}
          <Box sx={{ gridColumn: '1 / -1' }}>
            <TextInput control={control} name="note" label="Note" rows={3} most={10_000} />
          </Box>
        </Box>
      </Sheet>
    </>
  );
}

const gridSx = {
  display: 'grid',
  gridTemplateColumns: { xs: '1fr', sm: 'repeat(auto-fill, minmax(190px, 1fr))' },
  columnGap: 1.5,
  rowGap: 1.5,
  alignItems: 'start',
} as const;
