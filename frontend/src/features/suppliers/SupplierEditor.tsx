import Box from '@mui/material/Box';
import { useForm } from 'react-hook-form';
import type { Supplier } from '../../api/types';
import { ConflictNotice } from '../../components/ConflictNotice';
import { FormFoot } from '../../components/FormFoot';
import { UnsavedWarning } from '../../components/UnsavedWarning';
import { useVersionedForm } from '../../components/useVersionedForm';
import { supplierDifferences } from './supplierDifferences';
import { fieldOfSupplier, formOfSupplier, type SupplierForm } from './supplierForm';
import { SupplierFormFields } from './SupplierFormFields';

interface SupplierEditorProps {
  start: SupplierForm;
  /** The stored supplier under edit; absent for a new one. */
  supplier?: Supplier;
  /** Sends the form; gives what to do once it counts as saved. @throws Problem when refused */
  onSave: (form: SupplierForm, version: number) => Promise<() => void>;
  onCancel: () => void;
  saveName: string;
}

/** The add and edit form of a supplier; whatever the server refuses, the text stays. */
export function SupplierEditor({ start, supplier, onSave, onCancel, saveName }: SupplierEditorProps) {
  const form = useForm<SupplierForm>({ defaultValues: start });
  const saving = useVersionedForm({
    form,
    stored: supplier,
    onSave,
    fieldOf: fieldOfSupplier,
    formOf: formOfSupplier,
  });
  const { conflict } = saving;
  return (
    <Box
      component="form"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        saving.submit();
      }}
      sx={{ display: 'flex', flexDirection: 'column', gap: 1.5, maxWidth: 1080 }}
    >
      <UnsavedWarning dirty={saving.unsaved} what="this supplier" openedBy="edit" />
      {conflict !== null && (
        <ConflictNotice
          what="this supplier"
          theirs={conflict.theirs}
          differences={supplierDifferences(conflict.base, conflict.theirs, conflict.theirs.currency)}
          onKeepMine={saving.keepMine}
          onTakeTheirs={saving.takeTheirs}
        />
      )}
      <SupplierFormFields control={form.control} openOffers={supplier?.offers.open ?? 0} />
      <FormFoot
        refusal={saving.refusal}
        saveName={saveName}
        saving={form.formState.isSubmitting}
        onCancel={onCancel}
      />
    </Box>
  );
}
