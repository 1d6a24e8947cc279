import { createHash } from 'node:crypto';
import { type MappedTable } from '@stageyard/libs/bill-of-materials';
import { pricesText } from '../offer-changes.js';
import { type OfferPastePreviewDto } from './dto/offer-paste-preview.dto.js';
import { type OfferPasteRowDto } from './dto/offer-paste-row.dto.js';
import { type PlannedOffer } from './offer-plan.js';
import { type OfferColumn } from './paste-columns.js';

/** What planned offers look like before they are booked, row by row. */
export function previewOf(
  table: MappedTable<OfferColumn>,
  supplierCode: string,
  plan: readonly PlannedOffer[],
): OfferPastePreviewDto {
  const rows = plan.flatMap(rowsOf).sort((a, b) => a.row - b.row);
  const count = (action: OfferPasteRowDto['action']) => rows.filter((row) => row.action === action).length;
  return {
    columns: columnsOf(table),
    rows,
    counts: { add: count('add'), change: count('change'), same: count('same'), wrong: count('wrong') },
    token: tokenOf(supplierCode, plan),
  };
}

/** Names exactly what would be booked: the terms, and the versions of the offers that change. */
function tokenOf(supplierCode: string, plan: readonly PlannedOffer[]): string {
  const acts = plan.map(({ stated, action, part, before, content }) => [
    stated.rows.map(({ reader }) => reader.row),
    action,
    part?.number,
    before && [before.id, before.version],
    action === 'same' ? null : content,
  ]);
  return createHash('sha256')
    .update(JSON.stringify([supplierCode, acts]))
    .digest('base64url');
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

function columnsOf({ columns, ignored }: MappedTable<OfferColumn>): OfferPastePreviewDto['columns'] {
  return [
    ...columns.map(({ label, from, index }) => ({ name: label, from: from ?? `column ${index + 1}` })),
    ...ignored.map((from) => ({ name: 'left out', from })),
  ];
}
