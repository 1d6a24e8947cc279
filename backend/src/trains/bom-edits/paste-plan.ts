import { type BomLine, type MappedRow } from '@stageyard/libs/bill-of-materials';
import { RowReader, shownCell } from '../../common/paste/row-reader.js';
import { type Part } from '../../parts/entities/part.entity.js';
import { unitOf } from '../../parts/part-unit.js';
import { type ExtraLine } from '../bom-edits.js';
import { type BomPasteRowDto } from './dto/bom-paste.dto.js';
import { MOST_EXTRA_LINES } from './dto/extra-lines.dto.js';
import { quantityProblem } from './extra-line-rules.js';
import { type BomDraft, chooseForLine, refuseChoice } from './line-choice.js';
import { type ReadCells, readCells } from './paste-cells.js';
import { PASTE_COLUMNS, type PasteColumn } from './paste-columns.js';

/** What the rows are held against. */
export interface PasteGround {
  lines: readonly BomLine[];
  /** Parts that the rows name, by the text of the cell. */
  parts: ReadonlyMap<string, Part>;
  /** Gives an added line its id. */
  newId: () => string;
}

/** Goes through pasted rows one by one, says what each does, and does the good ones to a draft. */
export class PastePlan {
  private readonly byFind: ReadonlyMap<number, BomLine>;
  private readonly used = new Map<number, number>();
  /** Added lines as they are told apart: two alike are one. */
  private readonly added: Set<string>;

  constructor(
    readonly draft: BomDraft,
    private readonly ground: PasteGround,
  ) {
    this.byFind = new Map(ground.lines.map((line) => [line.findNumber, line]));
    this.added = new Set(draft.bomEdits.extraLines.map(identity));
  }

  take(row: MappedRow<PasteColumn>): BomPasteRowDto {
    const reader = new RowReader(row, PASTE_COLUMNS);
    const read = readCells(reader);
    const line = read.findNumber === null ? undefined : this.byFind.get(read.findNumber);
    const part = this.partNamed(reader, read.partNumber);
    const named = { findNumber: read.findNumber, partNumber: part?.number ?? (read.partNumber || null) };
    const answer = { row: row.row, ...named, partDescription: part?.description ?? null };
    const doubled = read.findNumber === null ? undefined : this.used.get(read.findNumber);
    if (read.findNumber !== null) this.used.set(read.findNumber, doubled ?? row.row);
    if (doubled !== undefined)
      reader.wrong('findNumber', `Row ${doubled} is for this find number already. Keep one.`);
    const outcome =
      read.findNumber === null
        ? this.add(reader, read, part)
        : line
          ? this.change(reader, read, line, part)
          : reader.wrong(
              'findNumber',
              `There is no find number ${read.findNumber}. Leave it blank to add a line.`,
            );
    if (reader.problems.length > 0 || !outcome) {
      const summary = reader.problems[0]?.message ?? '';
      return { ...answer, action: 'wrong', summary, changes: [], problems: reader.problems };
    }
    outcome.do?.();
    const { action, summary, changes } = outcome;
    return { ...answer, action, summary, changes, problems: [] };
  }

  private partNamed(reader: RowReader<PasteColumn>, number: string): Part | null {
    if (number === '') return null;
    const part = this.ground.parts.get(number);
    if (!part) reader.wrong('partNumber', `There is no part “${shownCell(number)}”. Check the number.`);
    return part ?? null;
  }

  private change(
    reader: RowReader<PasteColumn>,
    read: ReadCells,
    line: BomLine,
    part: Part | null,
  ): Outcome | null {
    if (line.extraLineId !== undefined) return this.changeAdded(reader, read, line, part);
    const { quantity, unit } = read;
    if (quantity !== null && Math.abs(quantity - line.quantity) > 1e-9) {
      const advice = `The kit gives ${line.quantity}. Leave the quantity blank, or add a line of its own.`;
      reader.wrong('quantity', advice);
    }
    if (unit !== null && unit !== line.unit)
      reader.wrong('unit', `The line is in ${line.unit}. Leave the unit blank.`);
    if (read.note !== '' && read.note !== line.note) {
      reader.wrong(
        'note',
        'A line of the kit keeps no note of its own. Leave it blank, or add a line of its own.',
      );
    }
    const was = line.partNumber ?? 'no part';
    if (!part || part.number === line.partNumber) return same(`${was} stands there already.`);
    const refusal = refuseChoice(this.draft.spec, line, part.number, part);
    if (refusal !== null) return reader.wrong('partNumber', refusal);
    return {
      action: 'choose',
      summary: `Takes ${part.number} for ${line.findNumber}, ${line.description}.`,
      changes: [`part ${was} → ${part.number}`],
      do: () => chooseForLine(this.draft, line, part),
    };
  }

  private changeAdded(
    reader: RowReader<PasteColumn>,
    read: ReadCells,
    line: BomLine,
    part: Part | null,
  ): Outcome | null {
    const was = this.draft.bomEdits.extraLines.find(({ id }) => id === line.extraLineId);
    if (!was) return null;
    const swapped = part !== null && part.number !== was.partNumber;
    const now: ExtraLine = {
      ...was,
      partNumber: part?.number ?? was.partNumber,
      // A description that was copied with the table belongs to the part that stood there.
      description:
        read.description === '' || read.description === line.description ? was.description : read.description,
      quantity: read.quantity ?? was.quantity,
      unit: read.unit ?? (part ? unitOf(part.kind) : was.unit),
      note: read.note === '' || read.note === line.note ? was.note : read.note,
    };
    if (swapped) checkNewPart(reader, part);
    checkUnit(reader, part, now);
    const changes = (['partNumber', 'description', 'quantity', 'unit', 'note'] as const)
      .filter((field) => now[field] !== was[field])
      .map((field) => `${WORDS[field]} ${was[field] || 'none'} → ${now[field] || 'none'}`);
    if (changes.length === 0) return same('The added line is like this already.');
    const summary = `Changes the added line ${line.findNumber}, ${line.description}.`;
    return {
      ...{ action: 'choose', summary, changes },
      do: () => {
        this.added.delete(identity(was));
        this.added.add(identity(Object.assign(was, now)));
      },
    };
  }

  private add(reader: RowReader<PasteColumn>, read: ReadCells, part: Part | null): Outcome | null {
    const { extraLines } = this.draft.bomEdits;
    if (read.quantity === null)
      reader.wrong('quantity', 'Say how many: the quantity of a new line is needed.');
    if (read.partNumber === '' && read.description === '') {
      reader.wrong('partNumber', 'Give a part number, or a description of what it is.');
    }
    if (part) checkNewPart(reader, part);
    const line: ExtraLine = {
      id: '',
      partNumber: part?.number ?? null,
      description: read.description,
      quantity: read.quantity ?? 0,
      unit: read.unit ?? (part ? unitOf(part.kind) : 'pcs'),
      note: read.note,
    };
    checkUnit(reader, part, line);
    if (this.added.has(identity(line))) return same('The same line was added before.');
    if (extraLines.length >= MOST_EXTRA_LINES) {
      const most = MOST_EXTRA_LINES.toLocaleString('en-GB');
      return reader.wrong('partNumber', `A bill of materials takes at most ${most} added lines.`);
    }
    const also = this.ground.lines.filter(({ partNumber }) => part && partNumber === part.number);
    const name = part ? `${part.number}, ${part.description}` : line.description;
    return {
      action: 'add',
      summary: `Adds ${line.quantity} ${line.unit} of ${name}.`,
      changes: also.map(({ findNumber, quantity, unit }) => `also on ${findNumber}: ${quantity} ${unit}`),
      do: () => {
        this.added.add(identity(line));
        extraLines.push({ ...line, id: this.ground.newId() });
      },
    };
  }
}

interface Outcome {
  action: 'choose' | 'add' | 'same';
  summary: string;
  changes: string[];
  do?: () => void;
}

const WORDS = {
  partNumber: 'part',
  description: 'description',
  quantity: 'quantity',
  unit: 'unit',
  note: 'note',
} as const;

/** An added line but for its id. */
function identity({ partNumber, description, quantity, unit, note }: ExtraLine): string {
  return JSON.stringify([partNumber, description, quantity, unit, note]);
}

const same = (summary: string): Outcome => ({ action: 'same', summary, changes: [] });

function checkNewPart(reader: RowReader<PasteColumn>, { number, standing }: Part): void {
  if (standing !== 'cleared') reader.wrong('partNumber', `${number} is ${standing}. Choose a cleared part.`);
}

function checkUnit(reader: RowReader<PasteColumn>, part: Part | null, { quantity, unit }: ExtraLine): void {
  const own = part ? unitOf(part.kind) : unit;
  if (own !== unit) reader.wrong('unit', `${part?.number ?? ''} is counted in ${own}. Leave the unit blank.`);
  const problem = quantityProblem(quantity, own);
  if (problem) reader.wrong('quantity', problem);
}
