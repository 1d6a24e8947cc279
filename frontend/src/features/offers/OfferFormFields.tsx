import Box from '@mui/material/Box';
import { useWatch, type UseFormReturn } from 'react-hook-form';
import { useSupplier } from '../../api/hooks/useSupplier';
import { ChoiceField } from '../../components/ChoiceField';
import { CurrencyField } from '../../components/CurrencyField';
import { DateField } from '../../components/DateField';
import { NumberField } from '../../components/NumberField';
import { leadTimeWords } from '../../components/offers/offerWords';
import { Sheet } from '../../components/Sheet';
import { TextInput } from '../../components/TextInput';
import { BreakEditor } from './BreakEditor';
import { LivePriceLine } from './LivePriceLine';
import type { OfferForm } from './offerForm';
import { PartPicker } from './PartPicker';
import { SupplierField } from './SupplierField';

interface OfferFormFieldsProps {
  form: UseFormReturn<OfferForm>;
  /** A new offer chooses its part and supplier; a stored one keeps them. */
  isNew: boolean;
  /** The part's unit: `pcs` or `l`. */
  unit: string;
}

const PER_CHOICES = ['1', '10', '100', '1000'].map((value) => ({ value, name: value }));

/** All fields of one offer: what and whose, at what price, when. */
export function OfferFormFields({ form, isNew, unit }: OfferFormFieldsProps) {
  const { control, setValue, getValues } = form;
  const code = useWatch({ control, name: 'supplierCode' });
  const { supplier } = useSupplier(code === '' ? null : code);
  const pieces = unit === 'pcs';
  const quantity = { unit, min: 0, above: true, max: 1_000_000, whole: pieces };
  return (
    <>
      <Sheet title="What is offered">
        <Box sx={gridSx}>
          {isNew && (
            <>
              <PartPicker control={control} />
              <SupplierField control={control} setValue={setValue} />
            </>
          )}
          <TextInput
            control={control}
            name="supplierPartNumber"
            label="Their part number"
            hint="Blank if they have none"
            most={80}
          />
          <TextInput
            control={control}
            name="source"
            label="Source"
            hint="A quotation’s number, a price list, a call"
          />
        </Box>
      </Sheet>
      <Sheet title="Price">
        <Box sx={{ ...gridSx, mb: 2 }}>
          <CurrencyField control={control} name="currency" />
          <ChoiceField
            control={control}
            name="per"
            label={`Prices are for, ${unit}`}
            choices={PER_CHOICES}
            hint="More than 1 for small parts"
          />
          <NumberField control={control} name="pack" label="Sold in packs of" required {...quantity} />
          <NumberField
            control={control}
            name="leastQuantity"
            label="Least order"
            hint="Blank: the first quantity below"
            {...quantity}
          />
        </Box>
        <BreakEditor form={form} unit={unit} />
        <Box sx={{ mt: 2 }}>
          <LivePriceLine control={control} unit={unit} />
        </Box>
      </Sheet>
      <Sheet title="When">
        <Box sx={gridSx}>
          <NumberField
            control={control}
            name="leadTimeDays"
            label="Lead time"
            unit="days"
            whole
            min={0}
            max={3650}
            hint={supplier ? `Blank: their usual one, ${leadTimeWords(supplier.leadTimeDays)}` : undefined}
          />
          <DateField
            control={control}
            name="pricedOn"
            label="Priced on"
            hint="its age counts from here"
            blank="The price’s age counts from here"
            required
          />
          <DateField control={control} name="validFrom" label="Valid from" required />
          <DateField
            control={control}
            name="validUntil"
            label="Valid until"
            blank="Blank: until further notice"
            check={(day) =>
              day < getValues('validFrom') ? 'It ends before it starts. Mend one of the days.' : null
            }
          />
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
  gridTemplateColumns: { xs: '1fr', sm: 'repeat(auto-fill, minmax(225px, 1fr))' },
  columnGap: 1.5,
  rowGap: 1.5,
  alignItems: 'start',
} as const;
