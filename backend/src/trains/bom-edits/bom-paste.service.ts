import { createHash, randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { mapColumns, readTable } from '@stageyard/libs/bill-of-materials';
import { type SignedInUser } from '../../auth/signed-in-user.js';
import { ChangedMeanwhileError } from '../../common/errors.js';
import { columnsOf, previewOutdated, wrongRows } from '../../common/paste/answers.js';
import { BomService } from '../bom.service.js';
import { type Train } from '../entities/train.entity.js';
import { StockGears } from '../stock-gears.service.js';
import { TrainReader } from '../train-reader.js';
import { BomEditing } from './bom-editing.service.js';
import { type BomPasteBookedDto, type BomPastePreviewDto, type BomPasteRowDto } from './dto/bom-paste.dto.js';
import { type BomPasteBookInputDto } from './dto/bom-paste-input.dto.js';
import { type BomDraft, draftOf } from './line-choice.js';
import { partNumberOf } from './paste-cells.js';
import { PASTE_COLUMNS } from './paste-columns.js';
import { PastePlan } from './paste-plan.js';

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
    if (preview.token !== input.token) throw previewOutdated(preview);
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
