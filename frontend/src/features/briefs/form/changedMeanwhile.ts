import type { BriefField, BriefForm } from './briefForm';
import { FIELD_NAMES } from './fieldNames';

/** One field somebody else changed while this form was open. */
export interface MeanwhileChange {
  field: BriefField;
  label: string;
  before: string;
  theirs: string;
  mine: string;
  /** Both changed it, to different things. */
  contested: boolean;
}

/** What the saved brief changed against the one this form began from, beside what was typed. */
export function changesMeanwhile(began: BriefForm, saved: BriefForm, typed: BriefForm): MeanwhileChange[] {
  const fields = Object.keys(FIELD_NAMES) as BriefField[];
  return fields
    .filter((field) => words(began[field]) !== words(saved[field]))
    .map((field) => {
      const [before, theirs, mine] = [words(began[field]), words(saved[field]), words(typed[field])];
      return {
        field,
        label: FIELD_NAMES[field].label,
        before,
        theirs,
        mine,
        contested: mine !== before && mine !== theirs,
      };
    });
}

const words = (value: BriefForm[BriefField]): string =>
  Array.isArray(value) ? value.join(' · ') : value.trim();
