import { Injectable } from '@nestjs/common';
import { mapColumns, type MappedTable, readTable } from '@stageyard/libs/bill-of-materials';
import { DataSource, type EntityManager } from 'typeorm';
import { type AuditRecord } from '../../audit/audit.service.js';
import { badInput, type ProblemError } from '../../common/errors.js';
import { previewOutdated, wrongRows } from '../../common/paste/answers.js';
import { politePause } from '../../common/polite-pause.js';
import { WriteQueue } from '../../database/write-queue.js';
import { SupplierReader } from '../../suppliers/supplier-reader.js';
import { OfferReader } from '../offer-reader.js';
import { type ChangedOffer, type NewOffer, OfferWriter } from '../offer-writer.js';
import { type OfferPasteBookInputDto, type OfferPasteInputDto } from './dto/offer-paste-input.dto.js';
import { type OfferPasteBookedDto, type OfferPastePreviewDto } from './dto/offer-paste-preview.dto.js';
import { groupRows } from './group-rows.js';
import { OfferPlan, type PlannedOffer } from './offer-plan.js';
import { OFFER_COLUMNS, type OfferColumn } from './paste-columns.js';
import { readGround } from './paste-ground.js';
import { previewOf } from './paste-preview.js';
import { readRow, type StatedRow } from './read-row.js';

type Pause = () => Promise<void>;

interface Planned {
  plan: PlannedOffer[];
  preview: OfferPastePreviewDto;
  supplier: ChangedOffer['supplier'];
}

/** A supplier's price list, pasted: looked at first, then booked as a whole or not at all. */
@Injectable()
export class OfferPaste {
  constructor(
    private readonly source: DataSource,
    private readonly queue: WriteQueue,
    private readonly suppliers: SupplierReader,
    private readonly reader: OfferReader,
    private readonly writer: OfferWriter,
  ) {}

  /** What the rows would do; nothing is booked. @throws ProblemError 404 for the supplier; InputError for no table */
  async preview(input: OfferPasteInputDto): Promise<OfferPastePreviewDto> {
    return (await this.plan(this.source.manager, input, politePause())).preview;
  }

  /**
   * Does what the preview of the token said, or nothing.
   * @throws ProblemError 400 when rows are wrong and are not to be left out; 409 `preview-outdated` with the new preview
   * when the rows would now do something else
   */
  async book(actor: AuditRecord['actor'], input: OfferPasteBookInputDto): Promise<OfferPasteBookedDto> {
    const pause = politePause();
    return this.queue.run(async (manager) => {
      const { plan, preview, supplier } = await this.plan(manager, input, pause);
      if (preview.token !== input.token) throw previewOutdated(preview);
      if (preview.counts.wrong > 0 && !input.leaveOutWrong) throw wrongRows(preview.rows);
      const added: NewOffer[] = [];
      const changed: ChangedOffer[] = [];
      let same = 0;
      for (const { action, part, before, content } of plan) {
        if (!part || !content) continue;
        if (action === 'same') same += 1;
        else if (before) changed.push({ before, content, part, supplier });
        else added.push({ content, part, supplier });
      }
      await this.writer.change(manager, actor, changed, pause);
      await this.writer.insert(manager, actor, added, pause);
      return { added: added.length, changed: changed.length, same, leftOut: preview.counts.wrong };
    });
  }

  private async plan(manager: EntityManager, input: OfferPasteInputDto, pause: Pause): Promise<Planned> {
    const supplier = await this.suppliers.load(manager, input.supplierCode);
    if (supplier.standing === 'closed') throw closedSupplier(supplier.code, supplier.name);
    const cells = readTable(input.text);
    await pause();
    const table = offerTable(cells);
    await pause();
    const defaults = input.defaults ?? {};
    const rows: StatedRow[] = [];
    for (const row of table.rows) {
      rows.push(readRow(row, { stated: defaults.currency, usual: supplier.currency }));
      await pause();
    }
    const ground = await readGround(manager, supplier, rows, this.reader.today(), pause);
    const planner = new OfferPlan(ground, defaults);
    const plan: PlannedOffer[] = [];
    for (const stated of groupRows(rows)) {
      plan.push(planner.take(stated));
      await pause();
    }
    return { plan, preview: await previewOf(table, supplier.code, plan, pause), supplier };
  }
}

/** @throws ProblemError or InputError naming `text` when it has no column of parts or of prices, or only a head */
function offerTable(cells: string[][]): MappedTable<OfferColumn> {
  const table = mapColumns(cells, OFFER_COLUMNS);
  if (!table.hasHead) return table;
  const has = (...keys: OfferColumn[]) => table.columns.some(({ key }) => keys.includes(key));
  const lacking = [
    ...(has('partNumber', 'supplierPartNumber') ? [] : ['“Part number” or “Supplier part number”']),
    ...(has('price', 'priceFrom') ? [] : ['“Price”']),
  ];
  if (lacking.length === 0) return table;
  const message = `The head row has no column ${lacking.join(' and none ')}. Add it, or paste without heads.`;
  throw badInput([{ field: 'text', value: '', message }]);
}

function closedSupplier(code: string, name: string): ProblemError {
  const message = `${code} “${name}” is closed, so nothing is taken from it. Open the supplier again first.`;
  return badInput([{ field: 'supplierCode', value: code, message }]);
}
