import { describe, expect, it } from 'vitest';
import { InputError, money } from '../../units/index.js';
import { cellDate, cellDecimal, cellMoney, cellWhole, mapColumns, readTable } from './index.js';

describe('reading a pasted table', () => {
  it.each([
    [
      'a\tb\nc\td',
      [
        ['a', 'b'],
        ['c', 'd'],
      ],
    ],
    [
      'a\tb\r\nc\td\r\n',
      [
        ['a', 'b'],
        ['c', 'd'],
      ],
    ],
    ['a\rb', [['a'], ['b']]],
    ['\ta', [['', 'a']]],
    ['a\t', [['a', '']]],
    ['a\n\nb\n\n \t \n', [['a'], [''], ['b']]],
    ['\uFEFFa\tb', [['a', 'b']]],
    [' a \t\u00A0b ', [['a', 'b']]],
    ['"a\tb"\tc', [['a\tb', 'c']]],
    ['"two\nlines"\tc\nd', [['two\nlines', 'c'], ['d']]],
    ['"two\r\nlines"\r\nd', [['two\r\nlines'], ['d']]],
    ['"say ""on"""\tb', [['say "on"', 'b']]],
    ['""\tb', [['', 'b']]],
    ['""""\tb', [['"', 'b']]],
    // An inch mark or an opening quote that never closes is text.
    ['1/2"\tb', [['1/2"', 'b']]],
    ['"wide" version\tb', [['"wide" version', 'b']]],
    ['"open\tb\nc', [['"open', 'b'], ['c']]],
  ])('%j', (text, rows) => {
    expect(readTable(text)).toEqual(rows);
  });

  it('reads 500 rows whose notes are quoted and hold line breaks', () => {
    const rows = Array.from({ length: 500 }, (_, i) => `KW-${i}\t${i}.50\t"line 1\nline ""${i}"""`);
    const table = readTable(`Part\tPrice\tNote\n${rows.join('\r\n')}\r\n`);
    expect(table).toHaveLength(501);
    expect(table[500]).toEqual(['KW-499', '499.50', 'line 1\nline "499"']);
  });

  it.each([
    ['nothing', '', /Nothing was pasted/],
    ['blanks', ' \t \r\n\t', /Nothing was pasted/],
    ['2,001 rows', 'a\n'.repeat(2001), /2,001 rows; at most 2,000/],
    ['41 columns', Array.from({ length: 41 }, () => 'a').join('\t'), /41 columns; at most 40/],
    ['more than a million characters', 'a'.repeat(1_000_001), /characters/],
  ])('refuses %s', (_name, text, message) => {
    expect(() => readTable(text)).toThrow(InputError);
    expect(() => readTable(text)).toThrow(message);
  });

  it('takes 2,000 rows of 40 columns', () => {
    const row = Array.from({ length: 40 }, () => 'a').join('\t');
    expect(readTable(`${row}\n`.repeat(2000))).toHaveLength(2000);
  });

  it('stays quick with quotes that are never closed', () => {
    const began = performance.now();
    expect(readTable('"""a\t""b\n'.repeat(1999))).toHaveLength(1999);
    expect(readTable('"a"b'.repeat(250_000))).toHaveLength(1);
    expect(readTable(`"${'""'.repeat(499_000)}`)).toHaveLength(1);
    expect(performance.now() - began).toBeLessThan(2000);
  });
});

const SPECS = [
  { key: 'part', label: 'Part number', synonyms: ['part', 'part no', 'item'], required: true },
  { key: 'from', label: 'From quantity', synonyms: ['qty', 'from'] },
  { key: 'price', label: 'Price', synonyms: ['unit price'] },
  { key: 'priceFrom', label: 'Price from', synonyms: ['price @'], series: true },
] as const;

describe('telling columns apart', () => {
  const mapped = (text: string) => mapColumns(readTable(text), SPECS);

  it('takes the declared order where there is no head', () => {
    const { hasHead, columns, rows } = mapped('KW-1\t10\t1.50\nKW-2\t\t2');
    expect(hasHead).toBe(false);
    expect(columns.map(({ key, from }) => [key, from])).toEqual([
      ['part', null],
      ['from', null],
      ['price', null],
    ]);
    expect(rows).toEqual([
      { row: 1, cells: { part: 'KW-1', from: '10', price: '1.50' }, series: [], spare: [] },
      { row: 2, cells: { part: 'KW-2', price: '2' }, series: [], spare: [] },
    ]);
  });

  it('takes heads in any order, by synonyms, whatever their case and punctuation', () => {
    const { hasHead, rows } = mapped('UNIT-PRICE:\tQty\tPart-No.\n1.50\t10\tKW-1');
    expect(hasHead).toBe(true);
    expect(rows).toEqual([
      { row: 2, cells: { part: 'KW-1', from: '10', price: '1.50' }, series: [], spare: [] },
    ]);
  });

  it('reads heads with a figure as a series', () => {
    const { columns, rows } = mapped('Item\tPrice from 1\tPrice from 10\tPrice @ 2.5\nKW-1\t4.20\t\t3.50');
    expect(columns.map(({ figure }) => figure)).toEqual([null, '1', '10', '2.5']);
    expect(rows[0]?.series).toEqual([
      { key: 'priceFrom', figure: '1', text: '4.20' },
      { key: 'priceFrom', figure: '2.5', text: '3.50' },
    ]);
  });

  it('stays quick with a first cell of half a million figures', () => {
    const cell = `a${'1.'.repeat(250_000)}x`;
    const began = performance.now();
    expect(mapped(`${cell}\t10\t1.50`).hasHead).toBe(false);
    // Matched as a head of a series, it takes minutes.
    expect(performance.now() - began).toBeLessThan(2000);
  });

  it('leaves unknown heads out and says so', () => {
    const { ignored, rows } = mapped('Part\tColour\tPrice\nKW-1\tblue\t2');
    expect(ignored).toEqual(['Colour']);
    expect(rows[0]).toEqual({ row: 2, cells: { part: 'KW-1', price: '2' }, series: [], spare: [] });
  });

  it('counts rows as the sheet does and passes over blank ones', () => {
    expect(mapped('Part\tPrice\n\nKW-1\t2\n\t\nKW-2\t3').rows.map(({ row }) => row)).toEqual([3, 5]);
  });

  it('tells cells beyond the declared order instead of dropping them', () => {
    expect(mapped('KW-1\t10\t1.50\tfast').rows[0]?.spare).toEqual(['fast']);
  });

  it('takes one word among data for data', () => {
    expect(mapped('item\t10\t1.50').hasHead).toBe(false);
  });

  it.each([
    [
      'a column named twice',
      'Part\tPrice\tUnit price\nKW-1\t1\t2',
      /“Price” and “Unit price” both mean Price/,
    ],
    ['a break named twice', 'Part\tPrice from 10\tPrice @ 10\nKW-1\t1\t2', /both mean Price from/],
    ['a head without the part', 'Price\tQty\n1\t2', /no column “Part number”/],
    ['a head alone', 'Part\tPrice', /Only column heads/],
  ])('refuses %s', (_name, text, message) => {
    expect(() => mapped(text)).toThrow(InputError);
    expect(() => mapped(text)).toThrow(message);
  });
});

describe('figures in cells', () => {
  const bounds = { above: 0, max: 1_000_000 };

  it.each([
    ['1.5', 1.5],
    ['1.500', 1.5],
    ['0.125', 0.125],
    ['12', 12],
    ['+3', 3],
    ['1,234.5', 1234.5],
    // A comma before one or two digits groups no thousands.
    ['1,5', 1.5],
    ['12,50', 12.5],
    ['1.234,5', 1234.5],
    ['999,999.25', 999_999.25],
    [' 7 ', 7],
    ['', null],
  ])('%j is %s', (text, value) => {
    expect(cellDecimal(text, bounds)).toEqual({ value, problem: null });
  });

  it.each([
    ['0,125', /comma before its decimals\. Write 0\.125\./],
    ['1.234,567', /Write 1234\.567\./],
    ['1,500', /two ways\. Write 1500, or 1\.500\./],
    ['1.5.2', /not a figure/],
    ['1 500', /not a figure/],
    ['1e3', /not a figure/],
    ['.5', /not a figure/],
    ['ten', /not a figure/],
    ['NaN', /not a figure/],
    ['1.2345', /more than 3 decimals/],
    ['0', /above 0/],
    ['-2', /above 0/],
    ['\u22122', /above 0/],
    ['1000001', /At most 1,000,000/],
    ['9'.repeat(400), /too large/],
  ])('refuses %s', (text, problem) => {
    const cell = cellDecimal(text, bounds);
    expect(cell.value).toBeNull();
    expect(cell.problem).toMatch(problem);
    expect(cell.problem?.length).toBeLessThan(160);
  });

  it('whole numbers take no decimals', () => {
    expect(cellWhole('10', bounds).value).toBe(10);
    expect(cellWhole('10.0', bounds).value).toBe(10);
    expect(cellWhole('10.5', bounds).problem).toMatch(/not a whole number/);
    expect(cellWhole('1,5', bounds).problem).toMatch(/not a whole number/);
    expect(cellWhole('0', { min: 0, max: 9 }).value).toBe(0);
    expect(cellWhole('-1', { min: 0, max: 9 }).problem).toMatch(/At least 0/);
  });
});

describe('days in cells', () => {
  it.each([
    ['2026-04-03', '2026-04-03'],
    ['3.4.2026', '2026-04-03'],
    ['03.04.2026', '2026-04-03'],
    ['29.2.2024', '2024-02-29'],
    ['', null],
  ])('%j is %s', (text, value) => {
    expect(cellDate(text)).toEqual({ value, problem: null });
  });

  it.each([
    ['03/04/2026', /can be 2026-04-03 or 2026-03-04/],
    ['25/04/2026', /Write 2026-04-25/],
    ['04/04/2026', /Write 2026-04-04/],
    ['31/31/2026', /not a day/],
    ['2026-02-30', /not a day/],
    ['30.2.2026', /not a day/],
    ['2026-4-3', /not a day/],
    ['3.4.26', /not a day/],
    ['46115', /not a day/],
    ['tomorrow', /not a day/],
  ])('refuses %s', (text, problem) => {
    expect(cellDate(text).value).toBeNull();
    expect(cellDate(text).problem).toMatch(problem);
  });
});

describe('amounts in cells', () => {
  it.each([
    ['12.50', 'EUR', money(1250, 'EUR')],
    ['12.5', 'EUR', money(1250, 'EUR')],
    ['12.50 EUR', null, money(1250, 'EUR')],
    ['1,234.50', 'EUR', money(123_450, 'EUR')],
    ['5,40', 'EUR', money(540, 'EUR')],
    ['12,50 EUR', null, money(1250, 'EUR')],
    ['1.234,50', 'EUR', money(123_450, 'EUR')],
    ['1,5', 'KWD', money(1500, 'KWD')],
    // Without decimals a comma can only group thousands.
    ['1,250', 'JPY', money(1250, 'JPY')],
    ['jpy 1,250', null, money(1250, 'JPY')],
    ['1.275', 'KWD', money(1275, 'KWD')],
    ['', 'EUR', null],
  ])('%j in %s', (text, currency, value) => {
    expect(cellMoney(text, currency)).toEqual({ value, problem: null });
  });

  it.each([
    ['1,5', 'JPY', /decimals/],
    ['0,125', 'KWD', /comma before its decimals\. Write 0\.125\./],
    ['1,250', 'EUR', /two ways/],
    ['1,250', 'KWD', /two ways/],
    ['-1.00', 'EUR', /cannot be negative/],
    ['1.005', 'EUR', /decimals/],
    ['1.5', 'JPY', /decimals/],
    ['1.50', null, /no currency/],
    ['1.50 USD', 'EUR', /USD/],
    ['1.50 XYZ', null, /XYZ/],
    ['€ 1.50', 'EUR', /not a figure/],
    ['free', 'EUR', /not a figure/],
    ['9'.repeat(30), 'EUR', /whole number of minor units/],
  ])('refuses %j in %s', (text, currency, problem) => {
    expect(cellMoney(text, currency).value).toBeNull();
    expect(cellMoney(text, currency).problem).toMatch(problem);
  });
});
