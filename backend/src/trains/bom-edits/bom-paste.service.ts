import { createHash, randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { mapColumns, type MappedTable, readTable } from '@stageyard/libs/bill-of-materials';
import { type SignedInUser } from '../../auth/signed-in-user.js';
import { badInput, ChangedMeanwhileError, conflict } from '../../common/errors.js';
import { BomService } from '../bom.service.js';
import { type Train } from '../entities/train.entity.js';
import { StockGears } from '../stock-gears.service.js';
import { TrainReader } from '../train-reader.js';
import { BomEditing } from './bom-editing.service.js';
import { type BomPasteBookedDto, type BomPastePreviewDto, type BomPasteRowDto } from './dto/bom-paste.dto.js';
import { type BomPasteBookInputDto } from './dto/bom-paste-input.dto.js';
import { type BomDraft, draftOf } from './line-choice.js';
import { partNumberOf } from './paste-cells.js';
import { PASTE_COLUMNS, type PasteColumn } from './paste-columns.js';
import { PastePlan } from './paste-plan.js';

/** Wrong rows named by one refusal. */
const MOST_NAMED = 20;

/** Rows of a spreadsheet that choose parts for lines by find number, or add lines. */
@Injectable()
export class BomPaste {
  constructor(
    private readonly editing: BomEditing,
    private readonly reader: TrainReader,
    private readonly boms: BomService,
    private readonly stock: StockGears,
  ) {}

  /** What the rows would do. @throws ProblemError 404; InputError when the text is no table */
  async preview(code: string, text: string): Promise<BomPastePreviewDto> {
    return (await this.plan(await this.reader.row(code), text)).preview;
  }

  /**
   * Does what the preview of the token said, in one edit, or nothing.
   * @throws ProblemError 400 when rows are wrong and are not to be left out; 409 when the rows would now do something
   * else, or the train changed since
   */
  async book(code: string, input: BomPasteBookInputDto, actor: SignedInUser): Promise<BomPasteBookedDto> {
    const train = await this.reader.row(code);
    const { preview, draft } = await this.plan(train, input.text);
    if (preview.token !== input.token) {
      const message =
        'What the rows would do has changed since the preview, so nothing was booked. Look at the new preview, then book again.';
      throw conflict('preview-outdated', message, { current: preview });
    }
    if (train.version !== input.version) throw new ChangedMeanwhileError(await this.reader.describe(train));
    const { choose, add, same, wrong } = preview.counts;
    if (wrong > 0 && !input.leaveOutWrong) throw wrongRows(preview.rows);
    const booked =
      choose + add === 0
        ? await this.reader.describe(train)
        : await this.editing.book(
            train,
            draft,
            actor,
            'pasted',
            `Pasted into the bill of materials of ${code}: ${choose} changed, ${add} added`,
          );
    return { chosen: choose, added: add, same, leftOut: wrong, train: booked };
  }

  private async plan(train: Train, text: string): Promise<{ preview: BomPastePreviewDto; draft: BomDraft }> {
    const table = mapColumns(readTable(text), PASTE_COLUMNS);
    const { lines } = await this.boms.build(train, await this.reader.figures(train));
    const parts = await this.stock.byNumber(table.rows.map(partNumberOf).filter((number) => number !== ''));
    const plan = new PastePlan(draftOf(train), { lines, parts, newId: randomUUID });
    const rows = table.rows.map((row) => plan.take(row));
    const count = (action: BomPasteRowDto['action']) => rows.filter((row) => row.action === action).length;
    const counts = { choose: count('choose'), add: count('add'), same: count('same'), wrong: count('wrong') };
    const token = createHash('sha256').update(JSON.stringify(rows)).digest('base64url');
    const preview = { columns: columnsOf(table), rows, counts, version: train.version, token };
    return { preview, draft: plan.draft };
  }
}

function columnsOf({ columns, ignored }: MappedTable<PasteColumn>): BomPastePreviewDto['columns'] {
  return [
    ...columns.map(({ label, from, index }) => ({ name: label, from: from ?? `column ${index + 1}` })),
    ...ignored.map((from) => ({ name: 'left out', from })),
  ];
}

function wrongRows(rows: readonly BomPasteRowDto[]) {
  const wrong = rows.filter(({ action }) => action === 'wrong');
  const message = `${wrong.length} ${wrong.length === 1 ? 'row is' : 'rows are'} wrong, so nothing was booked. Correct them, or leave them out.`;
  const named = wrong.slice(0, MOST_NAMED).map(({ row, summary }) => ({
    field: 'text',
    value: `row ${row}`,
    message: `Row ${row}: ${summary}`,
  }));
  return badInput(named, message);
}
