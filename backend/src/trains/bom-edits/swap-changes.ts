import { type BomLine, bomTotals } from '@stageyard/libs/bill-of-materials';
import { type TrainCheck, type TrainFigures } from '@stageyard/libs/train-planner';
import { formatMass } from '@stageyard/libs/units';
import { type SwapChangeDto, type SwapCheckDto } from './dto/swap-result.dto.js';

/** A train as it is, or as it would be. */
export interface TrainState {
  figures: TrainFigures;
  lines: readonly BomLine[];
  /** The line that the swap is about; undefined when it is gone. */
  line: BomLine | undefined;
}

type Verdict = SwapChangeDto['verdict'];
type TrainFinding = TrainFigures['findings'][number];

/** What differs between two states, other than checks and prices. */
export function swapChanges(before: TrainState, after: TrainState): SwapChangeDto[] {
  const { massKg: massBefore } = bomTotals(before.lines);
  const { massKg: massAfter } = bomTotals(after.lines);
  return [
    ...changed('Part', named(before.line), named(after.line)),
    ...changed('Material', before.line?.material ?? '', after.line?.material ?? ''),
    ...changed('Supply', before.line?.supply ?? '', after.line?.supply ?? ''),
    ...changed('Mass of all lines', formatMass(massBefore), formatMass(massAfter)),
    ...lostAndGained('Line', otherLines(before), otherLines(after), null, null),
    ...lostAndGained('Flag', flagsOf(before), flagsOf(after), 'better', 'worse'),
    ...findingChanges(before, after),
  ];
}

/** Checks whose value or verdict differs, or that only one of the states has. */
export function changedChecks(before: TrainFigures, after: TrainFigures): SwapCheckDto[] {
  const name = ({ code, label, stage }: TrainCheck) => JSON.stringify([code, label, stage]);
  const old = new Map(before.checks.map((check) => [name(check), check]));
  const now = new Map(after.checks.map((check) => [name(check), check]));
  return [...new Set([...old.keys(), ...now.keys()])].flatMap((key): SwapCheckDto[] => {
    const [was, is] = [old.get(key), now.get(key)];
    const check = is ?? was;
    if (!check || (was?.value === is?.value && was?.verdict === is?.verdict)) return [];
    const state = (one: TrainCheck | undefined) => one && { value: one.value, verdict: one.verdict };
    const { label, stage = null, unit } = check;
    return [{ label, stage, unit, before: state(was) ?? null, after: state(is) ?? null }];
  });
}

function changed(what: string, before: string, after: string, verdict: Verdict = null): SwapChangeDto[] {
  return before === after ? [] : [{ what, before, after, verdict }];
}

function lostAndGained(
  what: string,
  before: ReadonlySet<string>,
  after: ReadonlySet<string>,
  lost: Verdict,
  gained: Verdict,
): SwapChangeDto[] {
  return [
    ...[...before]
      .filter((one) => !after.has(one))
      .map((one) => ({ what, before: one, after: '', verdict: lost })),
    ...[...after]
      .filter((one) => !before.has(one))
      .map((one) => ({ what, before: '', after: one, verdict: gained })),
  ];
}

/** `KW-00012, Bearing 6201`. */
function named(line: BomLine | undefined): string {
  if (!line) return '';
  return line.partNumber === null ? line.description : `${line.partNumber}, ${line.description}`;
}

/** Lines come and go with a pinion that is cut on its shaft or not, or with the length of a hub. */
function otherLines({ lines, line }: TrainState): Set<string> {
  return new Set(
    lines.filter((one) => one !== line).map((one) => `${named(one)}: ${one.quantity} ${one.unit}`),
  );
}

function flagsOf({ lines }: TrainState): Set<string> {
  return new Set(lines.flatMap(({ source, flags }) => flags.map((flag) => `${source.join(', ')}: ${flag}`)));
}

/**
 * Findings lost, gained, and those that say something else of the same place. One that only names the other part is
 * the same finding.
 */
function findingChanges(before: TrainState, after: TrainState): SwapChangeDto[] {
  const [old, now] = [before, after].map(
    ({ figures, line }) => new Map(figures.findings.map((finding) => [withoutPart(finding, line), finding])),
  ) as [Map<string, TrainFinding>, Map<string, TrainFinding>];
  const lost = [...old].filter(([text]) => !now.has(text)).map(([, finding]) => finding);
  const gained = [...now].filter(([text]) => !old.has(text)).map(([, finding]) => finding);
  const changes = lost.map((finding): SwapChangeDto => {
    const index = gained.findIndex((other) => placeOf(other) === placeOf(finding));
    const [same] = index < 0 ? [] : gained.splice(index, 1);
    const messages = { before: finding.message, after: same?.message ?? '' };
    return { what: 'Finding', ...messages, verdict: same ? bySeverity(finding, same) : 'better' };
  });
  return [
    ...changes,
    ...gained.map(({ message }) => ({
      what: 'Finding',
      before: '',
      after: message,
      verdict: 'worse' as const,
    })),
  ];
}

function withoutPart({ code, message }: TrainFinding, line: BomLine | undefined): string {
  const number = line?.partNumber ?? null;
  return `${code} ${number === null ? message : message.replaceAll(number, '…')}`;
}

/** What a finding is about: its rule, stage and gear. */
function placeOf({ code, stage, message }: TrainFinding): string {
  const [role] = /pinion|wheel/.exec(message) ?? [];
  return JSON.stringify([code, stage, role]);
}

const SEVERITIES = ['note', 'marginal', 'fail'] as const;

function bySeverity(before: TrainFinding, after: TrainFinding): Verdict {
  const [old, now] = [SEVERITIES.indexOf(before.severity), SEVERITIES.indexOf(after.severity)];
  if (old === now) return 'same';
  return now < old ? 'better' : 'worse';
}
