import Box from '@mui/material/Box';
import { useDeferredValue, useMemo, type ReactNode } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import type { Part } from '../../api/types';
import { ConflictNotice } from '../../components/ConflictNotice';
import { FormFoot } from '../../components/FormFoot';
import { numberOrNull } from '../../components/NumberField';
import { UnsavedWarning } from '../../components/UnsavedWarning';
import { useVersionedForm } from '../../components/useVersionedForm';
import { differences } from './differences';
import { GeometryPanel } from './GeometryPanel';
import { liveGeometry } from './liveGeometry';
import { fieldOf, formOfPart, type PartForm } from './partForm';
import { PartFormFields } from './PartFormFields';
import { isToothed } from './partKinds';

interface PartEditorProps {
  start: PartForm;
  /** The stored part under edit; absent for a new one. */
  part?: Part;
  /**
   * Sends the form; `version` is the one it was based on (or agreed to overwrite). Gives what to do once the form
   * counts as saved, such as going on to another page.
   * @throws Problem when refused
   */
  onSave: (form: PartForm, version: number) => Promise<() => void>;
  onCancel: () => void;
  saveName: string;
  head?: ReactNode;
}

/**
 * The add and edit form with the geometry beside it. Whatever the server refuses, the text stays; a part that changed
 * meanwhile shows how, and the person decides.
 */
export function PartEditor({ start, part, onSave, onCancel, saveName, head }: PartEditorProps) {
  const form = useForm<PartForm>({ defaultValues: start });
  const { control, formState } = form;
  const saving = useVersionedForm({
    form,
    stored: part,
    onSave,
    fieldOf: (path, { kind: sent }) => fieldOf(sent, path),
    formOf: formOfPart,
  });
  const { conflict } = saving;
  const kind = useWatch({ control, name: 'kind' });
  const typed = useWatch({ control, name: 'attr' });
  const attr = useDeferredValue(typed);
  const live = useMemo(() => liveGeometry(attr), [attr]);

  return (
    <Box
      component="form"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        saving.submit();
      }}
    >
      <UnsavedWarning dirty={saving.unsaved} what="this part" />
      {head}
      {conflict !== null && (
        <ConflictNotice
          what="this part"
          theirs={conflict.theirs}
          differences={differences(conflict.base, conflict.theirs)}
          onKeepMine={saving.keepMine}
          onTakeTheirs={saving.takeTheirs}
        />
      )}
      <Box sx={isToothed(kind) ? layoutSx : undefined}>
        <Box sx={{ display: 'flex', flexDirection: 'column', gap: 1.5, minWidth: 0 }}>
          <PartFormFields control={control} kind={kind} isNew={part === undefined} />
          <FormFoot
            refusal={saving.refusal}
            saveName={saveName}
            saving={formState.isSubmitting}
            onCancel={onCancel}
          />
        </Box>
        {isToothed(kind) && (
          <Box sx={{ position: { lg: 'sticky' }, top: 68, minWidth: 0 }}>
            <GeometryPanel
              live={live}
              bore={numberOrNull(attr[kind === 'gear' ? 'bore' : 'shaftDiameter'])}
              shiftUnknown={(attr['profileShift'] ?? '').trim() === ''}
            />
          </Box>
        )}
      </Box>
    </Box>
  );
}

const layoutSx = {
  display: 'grid',
  gridTemplateColumns: { xs: '1fr', lg: 'minmax(0, 1fr) 360px' },
  gap: 2,
  alignItems: 'start',
} as const;
