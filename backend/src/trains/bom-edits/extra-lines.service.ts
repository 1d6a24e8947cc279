import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { type FieldIssue } from '@stageyard/libs/units';
import { type SignedInUser } from '../../auth/signed-in-user.js';
import { badInput } from '../../common/errors.js';
import { type Part } from '../../parts/entities/part.entity.js';
import { unitOf } from '../../parts/part-unit.js';
import { type ExtraLine, NO_EDITS } from '../bom-edits.js';
import { type TrainDto } from '../dto/train.dto.js';
import { StockGears } from '../stock-gears.service.js';
import { BomEditing } from './bom-editing.service.js';
import { type ExtraLineInputDto, type ExtraLinesInputDto } from './dto/extra-lines.dto.js';
import { quantityProblem } from './extra-line-rules.js';

/** Lines that people add to a bill of materials. */
@Injectable()
export class ExtraLines {
  constructor(
    private readonly editing: BomEditing,
    private readonly stock: StockGears,
  ) {}

  /**
   * Puts the given lines in the place of all added lines.
   * @throws ProblemError 400 naming every line that cannot be, 404, or 409 when the train changed since
   */
  async set(code: string, { version, lines }: ExtraLinesInputDto, actor: SignedInUser): Promise<TrainDto> {
    const train = await this.editing.seen(code, version);
    const edits = train.bomEdits ?? NO_EDITS;
    const parts = await this.stock.byNumber(lines.flatMap(({ partNumber }) => partNumber || []));
    const kept = new Map(edits.extraLines.map((line) => [line.id, line]));
    const issues: FieldIssue[] = [];
    const extraLines = lines.map((input, index) => {
      const was = input.id ? kept.get(input.id) : undefined;
      issues.push(...issuesOf(input, `lines.${index}`, was, parts));
      return toExtraLine(input, parts);
    });
    issues.push(...doubledIds(lines));
    if (issues.length > 0) throw badInput(issues);
    const change = { bomEdits: { ...edits, extraLines } };
    return this.editing.book(train, change, actor, 'changed', `Changed the added lines of ${code}`);
  }
}

function issuesOf(
  input: ExtraLineInputDto,
  path: string,
  was: ExtraLine | undefined,
  parts: ReadonlyMap<string, Part>,
): FieldIssue[] {
  const { id, partNumber, description, quantity, unit = 'pcs' } = input;
  const issues: FieldIssue[] = [];
  const refuse = (field: string, value: unknown, message: string) =>
    issues.push({ field: `${path}.${field}`, value, message });
  if (id && !was)
    refuse('id', id, `There is no added line “${id}” any more. Leave the id out to add it anew.`);
  const part = partNumber ? parts.get(partNumber) : undefined;
  if (partNumber && !part) {
    refuse(
      'partNumber',
      partNumber,
      `There is no part “${partNumber}”. Check the number, or look it up in Parts.`,
    );
  }
  // A part that was withdrawn after it was added stays and is flagged.
  if (part && part.standing !== 'cleared' && part.number !== was?.partNumber) {
    refuse('partNumber', partNumber, `${part.number} is ${part.standing}. Choose a cleared part.`);
  }
  if (!partNumber && description === '') {
    refuse('description', description, 'A line without a part number needs a description. Say what it is.');
  }
  const counted = part ? unitOf(part.kind) : unit;
  if (part && input.unit !== undefined && input.unit !== counted) {
    refuse(
      'unit',
      input.unit,
      `${part.number} is counted in ${counted}. Choose ${counted}, or leave the unit out.`,
    );
  }
  const problem = quantityProblem(quantity, counted);
  if (problem) refuse('quantity', quantity, problem);
  return issues;
}

function toExtraLine(input: ExtraLineInputDto, parts: ReadonlyMap<string, Part>): ExtraLine {
  const part = input.partNumber ? parts.get(input.partNumber) : undefined;
  return {
    id: input.id || randomUUID(),
    partNumber: part?.number ?? (input.partNumber || null),
    description: input.description,
    quantity: input.quantity,
    unit: part ? unitOf(part.kind) : (input.unit ?? 'pcs'),
    note: input.note,
  };
}

function doubledIds(lines: readonly ExtraLineInputDto[]): FieldIssue[] {
  const seen = new Set<string>();
  return lines.flatMap(({ id }, index): FieldIssue[] => {
    if (!id || !seen.has(id)) {
      if (id) seen.add(id);
      return [];
    }
    return [
      { field: `lines.${index}.id`, value: id, message: 'This line is given twice. Leave one of them out.' },
    ];
  });
}
