import { useDeferredValue, useEffect, useMemo, useState } from 'react';
import { useForm, useWatch, type UseFormReturn } from 'react-hook-form';
import { createBrief, saveBrief } from '../../../api/hooks/useBrief';
import { asProblem, type Problem } from '../../../api/problem';
import type { Brief, Requirement } from '../../../api/types';
import { briefHints } from '../hints/briefHints';
import type { Hint } from '../hints/hint';
import { formFromBrief, formFromRequirement, NEW_BRIEF, type BriefForm } from './briefForm';
import { changesMeanwhile, type MeanwhileChange } from './changedMeanwhile';
import { fieldForPath } from './fieldNames';
import { requirementFromForm } from './requirementFromForm';

/** Somebody saved the brief while it was open here. */
export interface Meanwhile {
  saved: Brief;
  changes: MeanwhileChange[];
}

export interface BriefFormState {
  form: UseFormReturn<BriefForm>;
  /** Unreadable text, then refusals of the server, then live hints. */
  remarks: Hint[];
  problem: Problem | null;
  meanwhile: Meanwhile | null;
  saving: boolean;
  /** Saves what is typed. Returns the saved brief, or null when something stood in the way (and is shown). */
  save: () => Promise<Brief | null>;
  /** Writes the other person's changes into the form and goes on from their version. */
  takeTheirs: () => void;
  /** Goes on from their version with what is typed here. */
  keepMine: () => Promise<Brief | null>;
}

/**
 * The form's state: reading, hints, saving with the version it began from, and what happens on a refusal.
 * @param change written into the form at the start, unsaved: what a “why not” proposed
 */
export function useBriefForm(brief: Brief | null, change?: Partial<Requirement>): BriefFormState {
  const [began, setBegan] = useState<Brief | null>(brief);
  const form = useForm<BriefForm>({ defaultValues: brief ? formFromBrief(brief) : NEW_BRIEF });
  const [problem, setProblem] = useState<Problem | null>(null);
  const [tried, setTried] = useState(false);
  const [meanwhile, setMeanwhile] = useState<Meanwhile | null>(null);
  const [saving, setSaving] = useState(false);

  const { setValue } = form;
  useEffect(() => {
    if (!brief || !change) return;
    const changed = formFromRequirement({ ...brief.requirement, ...change });
    for (const field of Object.keys(changed) as (keyof typeof changed)[]) {
      setValue(field, changed[field], { shouldDirty: true });
    }
    // Only once, when the form opens: afterwards it belongs to the person typing.
    // eslint-disable-next-line react-hooks/exhaustive-deps -- see above
  }, []);

  const typed = useDeferredValue(useWatch({ control: form.control }) as BriefForm);
  const live = useMemo(() => liveRemarks(typed, tried), [typed, tried]);
  const refused = useMemo(() => refusedFields(problem), [problem]);
  const remarks = useMemo(
    () => [...refused, ...live.filter((hint) => !refused.some(({ field }) => field === hint.field))],
    [refused, live],
  );

  async function saveOver(base: Brief | null): Promise<Brief | null> {
    setTried(true);
    const values = form.getValues();
    const reading = requirementFromForm(values);
    if (reading.requirement === null) {
      focusField(reading.issues[0]?.field);
      return null;
    }
    const body = { title: values.title.trim(), note: values.note, requirement: reading.requirement };
    setSaving(true);
    setProblem(null);
    try {
      const saved = base
        ? await saveBrief(base.id, { ...body, version: base.version })
        : await createBrief(body);
      setBegan(saved);
      setMeanwhile(null);
      form.reset(formFromBrief(saved));
      return saved;
    } catch (error) {
      const refusal = asProblem(error);
      if (refusal.changedMeanwhile && base) {
        const saved = refusal.current as Brief;
        const changes = changesMeanwhile(formFromBrief(base), formFromBrief(saved), values);
        setMeanwhile({ saved, changes });
      } else {
        setProblem(refusal);
        focusField(refusedFields(refusal)[0]?.field);
      }
      return null;
    } finally {
      setSaving(false);
    }
  }

  function takeTheirs(): void {
    if (!meanwhile) return;
    const theirs = formFromBrief(meanwhile.saved);
    const mine = form.getValues();
    const changed = new Set(meanwhile.changes.map(({ field }) => field));
    form.reset(theirs);
    for (const field of Object.keys(mine) as (keyof BriefForm)[]) {
      if (!changed.has(field)) form.setValue(field, mine[field], { shouldDirty: true });
    }
    setBegan(meanwhile.saved);
    setMeanwhile(null);
  }

  return {
    form,
    remarks,
    problem,
    meanwhile,
    saving,
    save: () => saveOver(began),
    takeTheirs,
    keepMine: () => saveOver(meanwhile?.saved ?? began),
  };
}

/** While typing, missing fields are not nagged about; after a try to save they are. */
function liveRemarks(typed: BriefForm, tried: boolean): Hint[] {
  const reading = requirementFromForm(typed);
  if (reading.requirement !== null) return briefHints(reading.requirement);
  const shown = tried ? reading.issues : reading.issues.filter(({ message }) => !isMissing(message));
  return shown.map(({ field, message }) => ({ field, kind: 'crossed', message }));
}

const isMissing = (message: string): boolean =>
  message.endsWith('is missing.') || message.startsWith('Give the brief');

function refusedFields(problem: Problem | null): Hint[] {
  return (problem?.errors ?? []).flatMap(({ field: path, message }) => {
    const field = fieldForPath(path);
    return field ? [{ field, kind: 'crossed' as const, message }] : [];
  });
}

/** Brings the field to be mended under the cursor. */
export function focusField(field: keyof BriefForm | undefined): void {
  if (field) document.getElementById(`brief-${field}`)?.focus();
}
