import Box from '@mui/material/Box';
import { useForm, useWatch } from 'react-hook-form';
import { usePart } from '../../api/hooks/usePart';
import type { Offer } from '../../api/types';
import { ConflictNotice } from '../../components/ConflictNotice';
import { FormFoot } from '../../components/FormFoot';
import { UnsavedWarning } from '../../components/UnsavedWarning';
import { useVersionedForm } from '../../components/useVersionedForm';
import { offerDifferences } from './offerDifferences';
import { fieldOfOffer, formOfOffer, type OfferForm } from './offerForm';
import { OfferFormFields } from './OfferFormFields';
import { usePartHit } from './usePartHit';

interface OfferEditorProps {
  start: OfferForm;
  /** The stored offer under edit; absent for a new one. */
  offer?: Offer;
  /** Sends the form; gives what to do once it counts as saved. @throws Problem when refused */
  onSave: (form: OfferForm, version: number) => Promise<() => void>;
  onCancel: () => void;
  saveName: string;
}

/** The add and edit form of an offer; whatever the server refuses, the text stays. */
export function OfferEditor({ start, offer, onSave, onCancel, saveName }: OfferEditorProps) {
  const form = useForm<OfferForm>({ defaultValues: start });
  const saving = useVersionedForm({
    form,
    stored: offer,
    onSave,
    fieldOf: fieldOfOffer,
    formOf: formOfOffer,
  });
  const { conflict } = saving;
  const partNumber = useWatch({ control: form.control, name: 'partNumber' });
  const { hit } = usePartHit(offer === undefined ? partNumber : '');
  const { part } = usePart(hit?.number ?? null);
  const unit = offer?.part.unit ?? part?.unit ?? 'pcs';
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
      <UnsavedWarning dirty={saving.unsaved} what="this offer" openedBy="edit" />
      {conflict !== null && (
        <ConflictNotice
          what="this offer"
          theirs={conflict.theirs}
          differences={offerDifferences(conflict.base, conflict.theirs, conflict.theirs)}
          onKeepMine={saving.keepMine}
          onTakeTheirs={saving.takeTheirs}
        />
      )}
      <OfferFormFields form={form} isNew={offer === undefined} unit={unit} />
      <FormFoot
        refusal={saving.refusal}
        saveName={saveName}
        saving={form.formState.isSubmitting}
        onCancel={onCancel}
      />
    </Box>
  );
}
