import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useEffect, useState } from 'react';
import { FormProvider, useFormState } from 'react-hook-form';
import type { Brief, Requirement } from '../../../api/types';
import { useNotices } from '../../../components/Notices';
import { PageHeader } from '../../../components/PageHeader';
import { UnsavedWarning } from '../../../components/UnsavedWarning';
import { BriefCheck } from './BriefCheck';
import { BriefFields } from './BriefFields';
import { MeanwhilePanel } from './MeanwhilePanel';
import { RemarksContext } from './remarks';
import { useBriefForm } from './useBriefForm';

interface BriefFormViewProps {
  /** null: a new brief. */
  brief: Brief | null;
  /** Written into the form at the start, unsaved. */
  change?: Partial<Requirement>;
  /** Saved and nothing left to do here. */
  onSaved: (brief: Brief) => void;
  onLeave: () => void;
}

/** The brief as a form, with its check beside it. */
export function BriefFormView({ brief, change, onSaved, onLeave }: BriefFormViewProps) {
  const state = useBriefForm(brief, change);
  const { tell } = useNotices();
  const { isDirty } = useFormState({ control: state.form.control });

  const [saved, setSaved] = useState<Brief | null>(null);

  async function finish(saving: Promise<Brief | null>): Promise<void> {
    setSaved(await saving);
  }

  // Leaving waits for the render in which the form counts as saved, or the warning would still stand in the way.
  useEffect(() => {
    if (!saved) return;
    tell(`${saved.code} saved.`);
    onSaved(saved);
  }, [saved, tell, onSaved]);

  return (
    <FormProvider {...state.form}>
      <RemarksContext.Provider value={state.remarks}>
        <UnsavedWarning
          dirty={isDirty && saved === null}
          what="this brief"
          openedBy={brief ? 'edit' : undefined}
        />
        <form
          noValidate
          onSubmit={(event) => {
            event.preventDefault();
            void finish(state.save());
          }}
        >
          <PageHeader
            title={brief ? brief.title : 'New brief'}
            code={brief?.code}
            facts={brief ? 'Edit brief' : 'What the train must do; the search does the rest.'}
            actions={
              <>
                <Button variant="outlined" onClick={onLeave}>
                  {brief ? 'Back to the options' : 'Cancel'}
                </Button>
                <Button type="submit" variant="contained" loading={state.saving}>
                  Save brief
                </Button>
              </>
            }
          />
          {state.meanwhile && (
            <MeanwhilePanel
              meanwhile={state.meanwhile}
              onTakeTheirs={state.takeTheirs}
              onKeepMine={() => void finish(state.keepMine())}
            />
          )}
          {state.problem && (
            <Alert severity="error" sx={{ mb: 1.5 }}>
              {state.problem.message}
            </Alert>
          )}
          <Box
            sx={{
              display: 'grid',
              gridTemplateColumns: { xs: '1fr', md: 'minmax(0, 1fr) 272px' },
              gap: { xs: 2, md: 3 },
            }}
          >
            <Box
              sx={{ bgcolor: 'background.paper', border: '1px solid', borderColor: 'line.rule', minWidth: 0 }}
            >
              <BriefFields />
            </Box>
            <BriefCheck remarks={state.remarks} />
          </Box>
        </form>
      </RemarksContext.Provider>
    </FormProvider>
  );
}
