import { useEffect, useState } from 'react';
import type { FieldPath, FieldValues, UseFormReturn } from 'react-hook-form';
import { asProblem } from '../api/problem';
import { applyProblem } from './applyProblem';

interface VersionedFormNeeds<Form extends FieldValues, Stored extends { version: number }> {
  form: UseFormReturn<Form>;
  /** What is under edit, as the form saw it; absent for a new one. */
  stored: Stored | undefined;
  /**
   * Sends the form; `version` is the one it was based on (or agreed to overwrite), 0 for a new one. Gives what to do
   * once the form counts as saved, such as going on to another page.
   * @throws Problem when refused
   */
  onSave: (values: Form, version: number) => Promise<() => void>;
  /** Where the server's dotted path stands on this form. */
  fieldOf: (path: string, values: Form) => FieldPath<Form> | null;
  formOf: (stored: Stored) => Form;
}

export interface VersionedForm<Stored> {
  /** What the server said that stands at no field. */
  refusal: string | null;
  /** Somebody saved in between: what the form began from and what stands there now. */
  conflict: { base: Stored; theirs: Stored } | null;
  /** Something typed would be lost by leaving. */
  unsaved: boolean;
  submit: () => void;
  keepMine: () => void;
  takeTheirs: () => void;
}

/**
 * Saving a form that carries the version it saw. Whatever the server refuses, the text stays; when somebody saved in
 * between, the person decides between theirs and what is typed here.
 */
export function useVersionedForm<Form extends FieldValues, Stored extends { version: number }>(
  needs: VersionedFormNeeds<Form, Stored>,
): VersionedForm<Stored> {
  const { form, stored, onSave, fieldOf, formOf } = needs;
  const [refusal, setRefusal] = useState<string | null>(null);
  const [base, setBase] = useState(stored);
  const [theirs, setTheirs] = useState<Stored | null>(null);
  const [next, setNext] = useState<(() => void) | null>(null);

  const send = async (values: Form, version: number): Promise<void> => {
    setRefusal(null);
    try {
      const then = await onSave(values, version);
      setNext(() => then);
    } catch (error) {
      const problem = asProblem(error);
      if (problem.changedMeanwhile && problem.current !== undefined) setTheirs(problem.current as Stored);
      else setRefusal(applyProblem(problem, form.setError, (path) => fieldOf(path, values)));
    }
  };
  // Runs after the warning about unsaved text has learned that nothing is unsaved any more.
  useEffect(() => next?.(), [next]);

  const goOnFrom = (newBase: Stored): void => {
    setBase(newBase);
    setTheirs(null);
  };
  const sendFrom = (version: number) => void form.handleSubmit((values) => send(values, version))();
  return {
    refusal,
    conflict: theirs !== null && base !== undefined ? { base, theirs } : null,
    unsaved: form.formState.isDirty && next === null,
    submit: () => sendFrom(base?.version ?? 0),
    keepMine: () => {
      if (theirs === null) return;
      goOnFrom(theirs);
      sendFrom(theirs.version);
    },
    takeTheirs: () => {
      if (theirs === null) return;
      goOnFrom(theirs);
      form.reset(formOf(theirs));
    },
  };
}
