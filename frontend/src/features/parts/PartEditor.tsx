import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useDeferredValue, useEffect, useMemo, useState, type ReactNode } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { asProblem } from '../../api/problem';
import type { Part } from '../../api/types';
import { applyProblem } from '../../components/applyProblem';
import { numberOrNull } from '../../components/NumberField';
import { UnsavedWarning } from '../../components/UnsavedWarning';
import { ConflictNotice } from './ConflictNotice';
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
  const [refusal, setRefusal] = useState<string | null>(null);
  const [base, setBase] = useState(part);
  const [theirs, setTheirs] = useState<Part | null>(null);
  const [next, setNext] = useState<(() => void) | null>(null);
  const { control, handleSubmit, setError, reset, formState } = useForm<PartForm>({ defaultValues: start });
  const { isDirty, isSubmitting } = formState;
  const kind = useWatch({ control, name: 'kind' });
  const typed = useWatch({ control, name: 'attr' });
  const attr = useDeferredValue(typed);
  const live = useMemo(() => liveGeometry(attr), [attr]);

  const send = async (form: PartForm, version: number) => {
    setRefusal(null);
    try {
      const then = await onSave(form, version);
      setNext(() => then);
    } catch (error) {
      const problem = asProblem(error);
      if (problem.changedMeanwhile && problem.current !== undefined) setTheirs(problem.current as Part);
      else setRefusal(applyProblem(problem, setError, (path) => fieldOf(form.kind, path)));
    }
  };
  // Runs after the warning below has learned that nothing is unsaved any more.
  useEffect(() => next?.(), [next]);
  const submit = handleSubmit((form) => send(form, base?.version ?? 0));

  return (
    <Box component="form" noValidate onSubmit={(event) => void submit(event)}>
      <UnsavedWarning dirty={isDirty && next === null} what="this part" />
      {head}
      {theirs !== null && base !== undefined && (
        <ConflictNotice
          base={base}
          theirs={theirs}
          onKeepMine={() => {
            setBase(theirs);
            setTheirs(null);
            void handleSubmit((form) => send(form, theirs.version))();
          }}
          onTakeTheirs={() => {
            setBase(theirs);
            setTheirs(null);
            reset(formOfPart(theirs));
          }}
        />
      )}
      <Box sx={isToothed(kind) ? layoutSx : undefined}>
        <Box sx={{ display: 'flex', flexDirection: 'column', gap: 1.5, minWidth: 0 }}>
          <PartFormFields control={control} kind={kind} isNew={part === undefined} />
          <Box sx={barSx}>
            {/* Here, beside the button that was pressed: the head of a long form is out of sight. */}
            {refusal !== null && (
              <Alert severity="error" sx={{ flexBasis: '100%' }}>
                {refusal}
              </Alert>
            )}
            <Button type="submit" variant="contained" disabled={isSubmitting}>
              {isSubmitting ? 'Saving…' : saveName}
            </Button>
            <Button onClick={onCancel}>Cancel</Button>
          </Box>
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

const barSx = {
  display: 'flex',
  flexWrap: 'wrap',
  gap: 1,
  position: 'sticky',
  bottom: 0,
  py: 1.25,
  bgcolor: 'background.default',
  borderTop: '1px solid',
  borderColor: 'line.rule',
  zIndex: 2,
} as const;
