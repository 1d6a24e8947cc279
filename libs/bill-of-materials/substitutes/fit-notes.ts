import { formatTrimmed } from '../../units/index.js';
import { type Fit } from './substitute-part.js';

/** Figures that differ by less are the same: both come from decimals. */
export const SAME = 1e-6;

/** Collects what the rules of fit find. Figures are shown with at most four decimals. */
export class FitNotes {
  private readonly misfits: string[] = [];
  private readonly differences: string[] = [];
  private readonly toCheck: string[] = [];

  misfit(reason: string): void {
    this.misfits.push(reason);
  }

  differs(difference: string): void {
    this.differences.push(difference);
  }

  check(question: string): void {
    this.toCheck.push(question);
  }

  /** Must be the same; what one of the two does not state is to be checked. */
  equal(name: string, wanted: number | null, has: number | null, unit = 'mm'): void {
    if (wanted === null && has === null) return;
    if (has === null) return this.check(`${name} is not stated; ${figure(wanted, unit)} is needed`);
    if (wanted === null) return this.check(`${name} ${figure(has, unit)}: see that it fits`);
    if (Math.abs(wanted - has) > SAME) {
      this.misfit(`${name} ${figure(has, unit)}, not ${figure(wanted, unit)}`);
    }
  }

  /** Must be at least as large; more is said. */
  atLeast(name: string, wanted: number | null, has: number | null, unit = 'mm'): void {
    if (wanted === null && has === null) return;
    if (has === null) return this.check(`${name} is not stated; at least ${figure(wanted, unit)} is needed`);
    if (wanted === null) return this.check(`${name} ${figure(has, unit)}: see that it is enough`);
    if (has < wanted - SAME) {
      this.misfit(`${name} ${figure(has, unit)}, less than ${figure(wanted, unit)}`);
    } else if (has > wanted + SAME) {
      this.differs(`${name} ${figure(has, unit)}, ${figure(has - wanted, unit)} more`);
    }
  }

  /** Words that must be the same, whatever the case of their letters and blanks between them. */
  sameWords(name: string, wanted: string | null, has: string | null): void {
    if (wanted === null && has === null) return;
    if (has === null) return this.check(`${name} is not stated; ${wanted} is needed`);
    if (wanted === null) return this.check(`${name} ${has}: see that it suits`);
    if (plain(wanted) !== plain(has)) this.misfit(`${name} ${has}, not ${wanted}`);
  }

  result(): Fit {
    const { misfits, differences, toCheck } = this;
    return { fits: misfits.length === 0, misfits, differences, toCheck };
  }
}

/** Words without what does not tell them apart. */
export function plain(words: string): string {
  return words.toLowerCase().replace(/[\s_-]+/g, '');
}

export function figure(value: number | null, unit: string): string {
  return `${formatTrimmed(value, 4)}${unit === '' || unit === '°' ? unit : ` ${unit}`}`;
}
