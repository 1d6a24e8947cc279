import { describe, expect, it } from 'vitest';
import { plainText, toTsv } from './copyTsv';

describe('toTsv', () => {
  it('keeps one cell one cell, whatever stands in it', () => {
    expect(
      toTsv([
        ['Part', 'Note'],
        ['KW-00017', 'two\tcolumns\r\nand lines'],
        [3, null],
      ]),
    ).toBe('Part\tNote\nKW-00017\ttwo columns and lines\n3\t');
  });

  it.each([
    ['=1+1', "'=1+1"],
    ['+49 40 1234', "'+49 40 1234"],
    ['@sum', "'@sum"],
    ['-cheap', "'-cheap"],
    // Figures stay figures.
    ['-0.507', '-0.507'],
    ['+0.172', '+0.172'],
    ['.5', '.5'],
  ])('keeps %s from being run as a formula', (text, copied) => {
    expect(toTsv([[text]])).toBe(copied);
  });
});

describe('plainText', () => {
  it.each([
    ['\u22120.507', '-0.507'],
    ['1,234.50', '1234.50'],
    ['–', ''],
    ['1,234.50 EUR', '1,234.50 EUR'],
    ['16, 18, 20', '16, 18, 20'],
  ])('%s is copied as %s', (shown, copied) => {
    expect(plainText(shown)).toBe(copied);
  });
});
