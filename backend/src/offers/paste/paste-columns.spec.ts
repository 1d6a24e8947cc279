import { mapColumns } from '@stageyard/libs/bill-of-materials';
import { describe, expect, it } from 'vitest';
import { OFFER_COLUMNS } from './paste-columns.js';

describe('heads of pasted offers', () => {
  it('knows the heads that the list and the form of offers write', () => {
    for (const head of ['Their number', 'Their part number']) {
      const { columns, ignored } = mapColumns(
        [
          ['Part', head, 'From quantity', 'Price'],
          ['KW-1', 'T-9', '1', '2.50'],
        ],
        OFFER_COLUMNS,
      );
      expect(columns.map(({ key }) => key)).toEqual(['partNumber', 'supplierPartNumber', 'from', 'price']);
      expect(ignored).toEqual([]);
    }
  });
});
