import { createHash } from 'node:crypto';
import { type MappedTable } from '@stageyard/libs/bill-of-materials';
import { columnsOf } from '../../common/paste/answers.js';
import { pricesText } from '../offer-changes.js';
import { type OfferPastePreviewDto } from './dto/offer-paste-preview.dto.js';
import { type OfferPasteRowDto } from './dto/offer-paste-row.dto.js';
import { type PlannedOffer } from './offer-plan.js';
import { type OfferColumn } from './paste-columns.js';

/**
 * What planned offers look like before they are booked, row by row.
 * @param pause called after each offer, so that others get their turn
 */
export async function previewOf(
  table: MappedTable<OfferColumn>,
  supplierCode: string,
  plan: readonly PlannedOffer[],
  pause: () => Promise<void>,
): Promise<OfferPastePreviewDto> {
  const rows: OfferPasteRowDto[] = [];
  const counts = { add: 0, change: 0, same: 0, wrong: 0 };
  const token = createHash('sha256').update(supplierCode);
  for (const planned of plan) {
    rows.push(...rowsOf(planned));
    counts[planned.action] += planned.stated.rows.length;
    token.update(actOf(planned));
    await pause();
  }
  rows.sort((a, b) => a.row - b.row);
  return { columns: columnsOf(table), rows, counts, token: token.digest('base64url') };
}

/** Names exactly what would be booked: the terms, and the version of the offer that changes. */
function actOf({ stated, action, part, before, content }: PlannedOffer): string {
  const rows = stated.rows.map(({ reader }) => reader.row);
  const changed = before && [before.id, before.version];
  return JSON.stringify([rows, action, part?.number, changed, action === 'same' ? null : content]);
}

function rowsOf(planned: PlannedOffer): OfferPasteRowDto[] {
  const { stated, action, part, changes } = planned;
  const first = stated.rows[0]?.reader.row;
  const wrongRow = stated.rows.find(({ reader }) => reader.problems.length > 0)?.reader.row;
  return stated.rows.map(({ reader, partNumber, supplierPartNumber }) => {
    const problems =
      action === 'wrong' && reader.problems.length === 0
        ? [
            {
              column: '',
              value: '',
              message: `Row ${wrongRow} of the same offer is wrong, so this row is too.`,
            },
          ]
        : reader.problems;
    const leads = reader.row === first;
    return {
      row: reader.row,
      action,
      partNumber: part?.number ?? (partNumber || null),
      partDescription: part?.description ?? null,
      supplierPartNumber,
      summary:
        problems[0]?.message ??
        (leads ? summaryOf(planned) : `A further price of the offer in row ${first}.`),
      changes: leads ? changes : [],
      problems,
    };
  });
}

function summaryOf({ action, content, before, beside }: PlannedOffer): string {
  const prices = content ? pricesText(content) : '';
  if (action === 'change') return `Changes offer ${before?.id ?? ''}.`;
  if (action === 'same') return `Offer ${before?.id ?? ''} says this already.`;
  if (!beside) return `New offer: ${prices}.`;
  return `New offer from ${content?.validFrom ?? ''}: ${prices}. Offer ${beside.id} goes on beside it until it ends or is closed.`;
}
