import { useSuppliers } from '../../api/hooks/useSuppliers';
import { ChoiceFilter } from '../../components/FilterFields';

interface SupplierFilterProps {
  value: string;
  onSet: (code: string) => void;
}

/** Offers of one supplier; lists the first hundred by name, and whichever the address names. */
export function SupplierFilter({ value, onSet }: SupplierFilterProps) {
  const { page } = useSuppliers({ sort: 'name', size: 100 });
  return (
    <ChoiceFilter
      label="Supplier"
      width={170}
      value={value}
      onSet={onSet}
      choices={(page?.items ?? []).map(({ code, name }) => ({ value: code, name }))}
    />
  );
}
