import { describe, expect, it, vi } from 'vitest';
import { formatCount, formatFixed, formatMass, formatPlain, formatQuantity, formatSigned } from './figures';
import { toTsv } from './copyTsv';

describe('figures', () => {
  it('writes a real minus sign and never minus nought', () => {
    expect(formatFixed(-0.507, 3)).toBe('\u22120.507');
    expect(formatFixed(-0.0001, 3)).toBe('0.000');
    expect(formatSigned(0.211, 3)).toBe('+0.211');
    expect(formatSigned(-0.0001, 3)).toBe('0.000');
    expect(formatSigned(-1, 1)).toBe('\u22121.0');
  });

  it('writes a dash for what is not known and for what is no number', () => {
    expect([null, undefined, Number.NaN, Infinity].map((value) => formatFixed(value, 2))).toEqual([
      '–',
      '–',
      '–',
      '–',
    ]);
    expect(formatPlain(null)).toBe('–');
  });

  it('does not let a light thing read as weighing nothing', () => {
    expect([0.0004, 0.0006, 1.14, null].map(formatMass)).toEqual(['< 0.001', '0.001', '1.140', '–']);
  });

  it('drops trailing zeros of plain figures and groups counts', () => {
    expect(formatPlain(1.25)).toBe('1.25');
    expect(formatPlain(20)).toBe('20');
    expect(formatCount(41208113)).toBe('41,208,113');
  });

  it('parts the thousands of quantities and keeps their thousandths', () => {
    expect([1250, 0.5, 1000.125, -2, null].map(formatQuantity)).toEqual([
      '1,250',
      '0.5',
      '1,000.125',
      '\u22122',
      '–',
    ]);
  });

  it('writes a day of the calendar as it is, wherever the reader sits', async () => {
    // Ten hours behind Greenwich, where the first minute of 1 December is still November.
    vi.stubEnv('TZ', 'Pacific/Honolulu');
    vi.resetModules();
    const there = await import('./figures');
    expect(there.formatDay('2026-12-01T00:00:00Z')).toBe('30 Nov 2026');
    expect(there.formatDay('2026-12-01')).toBe('1 Dec 2026');
    vi.unstubAllEnvs();
  });
});

describe('toTsv', () => {
  it('parts cells by tabs and rows by line ends, whatever a cell holds', () => {
    expect(
      toTsv([
        ['a\tb', 1, null],
        ['c\nd', -2.5, undefined],
      ]),
    ).toBe('a b\t1\t\nc d\t-2.5\t');
  });
});
