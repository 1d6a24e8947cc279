import type { Train, TrainSpec, TrainSummary } from '../../api/types';
import { boxWords, errorWords, exactRatioWords, ratioWords } from '../../components/optionWords';
import { formatCount, formatFixed } from '../../components/figures';

/** `18/110 · 19/116`. */
export function specTeethWords(spec: Pick<TrainSpec, 'stages'>): string {
  return spec.stages.map(({ pinion, wheel }) => `${pinion.teeth}/${wheel.teeth}`).join(' · ');
}

/** `Revision A, working`, the exact ratio with its error, box, mass, how many to build: what stands under the title. */
export function trainFacts(train: TrainSummary & Pick<Train, 'buildQuantity'>): string[] {
  const { ratio } = train;
  const error = ratio.errorPercent === null ? '' : ` (${errorWords(ratio.errorPercent)} %)`;
  const exact = ratio.denominator === '1' ? '' : `${exactRatioWords(ratio).replace(' : 1', '')} = `;
  return [
    `Revision ${train.revision}, ${train.state}`,
    `${exact}${ratioWords(ratio.value)} : 1${error}`,
    `${boxWords(train.box)} mm`,
    `${formatFixed(train.mass, 2)} kg`,
    `${formatCount(train.buildQuantity)} to build`,
  ];
}

export interface CheckTally {
  passes: number;
  marginal: number;
  fails: number;
  /** Remarks that stand beside the checks, such as a bore that does not suit its shaft. */
  findings: number;
}

export function tallyOf({ checks, findings }: Pick<Train['figures'], 'checks' | 'findings'>): CheckTally {
  const tally: CheckTally = { passes: 0, marginal: 0, fails: 0, findings: 0 };
  for (const { verdict } of checks) tally[verdict] += 1;
  const counted = checks.filter(({ verdict }) => verdict !== 'passes');
  for (const { code, severity, stage } of findings) {
    const isCheck = counted.some((check) => check.stage === stage && check.code.startsWith(code));
    if (severity !== 'note' && !isCheck) tally.findings += 1;
  }
  return tally;
}

/** The four pages of a train, as they stand in the address. */
export const TRAIN_TABS = [
  { value: 'drawing', name: 'Drawing' },
  { value: 'stages', name: 'Stages' },
  { value: 'bom', name: 'Bill of materials' },
  { value: 'record', name: 'Record' },
] as const;

export type TrainTab = (typeof TRAIN_TABS)[number]['value'];

export const readTab = (text: string | null): TrainTab =>
  TRAIN_TABS.find(({ value }) => value === text)?.value ?? 'drawing';
