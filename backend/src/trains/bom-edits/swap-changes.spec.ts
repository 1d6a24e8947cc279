import { type BomLine } from '@stageyard/libs/bill-of-materials';
import { type TrainCheck, type TrainFigures } from '@stageyard/libs/train-planner';
import { describe, expect, it } from 'vitest';
import { changedChecks, swapChanges, type TrainState } from './swap-changes.js';

type Finding = TrainFigures['findings'][number];

const line = (partNumber: string, over: Partial<BomLine> = {}): BomLine => ({
  ...{ findNumber: 101, key: partNumber, partNumber, kind: 'gear', description: 'Spur gear', quantity: 2 },
  ...{
    unit: 'pcs',
    material: 'C45',
    supply: 'bought',
    supplier: null,
    mass: 1.25,
    source: ['Stage 1 wheel'],
  },
  ...{ note: '', flags: [] },
  ...over,
});

const finding = (message: string, over: Partial<Finding> = {}): Finding => ({
  ...{ code: 'bore-differs', severity: 'marginal', message, stage: 0 },
  ...over,
});

/** Only checks and findings of a train's figures are looked at. */
const figures = (findings: Finding[], checks: TrainCheck[] = []) =>
  ({ findings, checks }) as unknown as TrainFigures;

const state = (own: BomLine, findings: Finding[] = [], others: BomLine[] = []): TrainState => ({
  figures: figures(findings),
  lines: [own, ...others],
  line: own,
});

describe('swapChanges', () => {
  it('says nothing of a finding that only names the other part', () => {
    const before = state(line('KW-1'), [finding('Stage 1 wheel, KW-1, has a bore of 10 mm.')]);
    const after = state(line('KW-2'), [finding('Stage 1 wheel, KW-2, has a bore of 10 mm.')]);
    expect(swapChanges(before, after).map(({ what }) => what)).toEqual(['Part']);
  });

  it('puts a finding that says something else of the same gear in one row', () => {
    const [old, now] = [
      'Stage 1 wheel, KW-1, has a bore of 10 mm.',
      'Stage 1 wheel, KW-2, has a bore of 9 mm.',
    ];
    const changes = swapChanges(state(line('KW-1'), [finding(old)]), state(line('KW-2'), [finding(now)]));
    expect(changes.slice(1)).toEqual([{ what: 'Finding', before: old, after: now, verdict: 'same' }]);
  });

  it('keeps findings of the pinion and the wheel, and of other rules, apart', () => {
    const before = state(line('KW-1'), [finding('Stage 1 pinion, KW-8, has a bore of 10 mm.')]);
    const after = state(line('KW-2'), [
      finding('Stage 1 wheel, KW-2, has a bore of 9 mm.'),
      finding('Stage 1 wheel, KW-2, is withdrawn.', { code: 'part-not-cleared' }),
    ]);
    expect(swapChanges(before, after).map(({ what, verdict }) => [what, verdict])).toEqual([
      ['Part', null],
      ['Finding', 'better'],
      ['Finding', 'worse'],
      ['Finding', 'worse'],
    ]);
  });

  it('adds up masses, names flags with their places, and lines that come and go', () => {
    const before = state(line('KW-1', { flags: ['part is withdrawn'] }), [], [line('KW-9', { kind: 'key' })]);
    const after = state(line('KW-2', { mass: 1.5, supply: 'made', material: '42CrMo4' }));
    expect(swapChanges(before, after)).toEqual([
      { what: 'Part', before: 'KW-1, Spur gear', after: 'KW-2, Spur gear', verdict: null },
      { what: 'Material', before: 'C45', after: '42CrMo4', verdict: null },
      { what: 'Supply', before: 'bought', after: 'made', verdict: null },
      // 2 × 1.25 + 2 × 1.25 = 5 kg; 2 × 1.5 = 3 kg.
      { what: 'Mass of all lines', before: '5.00 kg', after: '3.00 kg', verdict: null },
      { what: 'Line', before: 'KW-9, Spur gear: 2 pcs', after: '', verdict: null },
      { what: 'Flag', before: 'Stage 1 wheel: part is withdrawn', after: '', verdict: 'better' },
    ]);
  });
});

describe('changedChecks', () => {
  const check = (
    value: number,
    verdict: TrainCheck['verdict'],
    over: Partial<TrainCheck> = {},
  ): TrainCheck => ({
    ...{
      code: 'contact-ratio',
      label: 'Contact ratio',
      value,
      limit: 1.2,
      unit: '',
      verdict,
      stage: 0,
      message: '',
    },
    ...over,
  });

  it('names checks whose value or verdict changes, and those that come and go', () => {
    const torsion = check(12, 'passes', { code: 'shaft-diameter', label: 'Diameter of shaft 0', unit: 'mm' });
    delete torsion.stage;
    const before = figures([], [check(1.5, 'passes'), check(1.3, 'passes', { stage: 1 }), torsion]);
    const after = figures([], [check(1.1, 'fails'), check(1.3, 'passes', { stage: 1 })]);
    expect(changedChecks(before, after)).toEqual([
      {
        ...{ label: 'Contact ratio', stage: 0, unit: '' },
        before: { value: 1.5, verdict: 'passes' },
        after: { value: 1.1, verdict: 'fails' },
      },
      {
        ...{ label: 'Diameter of shaft 0', stage: null, unit: 'mm' },
        before: { value: 12, verdict: 'passes' },
        after: null,
      },
    ]);
  });
});
