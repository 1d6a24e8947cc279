import { useController, type Control, type UseFormSetValue } from 'react-hook-form';
import { SupplierPicker } from '../../components/SupplierPicker';
import type { OfferForm } from './offerForm';

interface SupplierFieldProps {
  control: Control<OfferForm>;
  setValue: UseFormSetValue<OfferForm>;
}

/** Who offers it; the prices then start in that supplier's currency. */
export function SupplierField({ control, setValue }: SupplierFieldProps) {
  const { field, fieldState } = useController({
    control,
    name: 'supplierCode',
    rules: { validate: (code) => code !== '' || 'Say who offers it.' },
  });
  return (
    <SupplierPicker
      code={field.value}
      required
      inputRef={field.ref}
      onBlur={field.onBlur}
      onPick={(supplier) => {
        field.onChange(supplier?.code ?? '');
        if (supplier !== null) setValue('currency', supplier.currency, { shouldDirty: true });
      }}
      error={fieldState.error?.message}
      hint="A code or a name finds it"
    />
  );
}
