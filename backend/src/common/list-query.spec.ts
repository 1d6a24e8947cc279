import { plainToInstance } from 'class-transformer';
import { validateSync } from 'class-validator';
import { describe, expect, it } from 'vitest';
import { ProblemError } from './errors.js';
import { ListQueryDto, parseListQuery } from './list-query.js';

const SORTS = ['number', 'module', 'mass'] as const;

function fieldsAtFault(query: object): string[] {
  return validateSync(plainToInstance(ListQueryDto, query)).map(({ property }) => property);
}

describe('a list query', () => {
  it('has a default for everything', () => {
    expect(parseListQuery({}, SORTS)).toEqual({ page: 1, size: 25, skip: 0, sorts: [], text: null });
  });

  it('reads page and size as numbers and skips the pages before', () => {
    const query = plainToInstance(ListQueryDto, { page: '3', size: '100', text: '  m 1.25 ' });
    expect(validateSync(query)).toEqual([]);
    expect(parseListQuery(query, SORTS)).toMatchObject({ page: 3, size: 100, skip: 200, text: 'm 1.25' });
  });

  it('sorts by two keys, downwards after a minus', () => {
    expect(parseListQuery({ sort: '-module,number' }, SORTS).sorts).toEqual([
      { field: 'module', direction: 'DESC' },
      { field: 'number', direction: 'ASC' },
    ]);
  });

  it.each([
    'passwordHash',
    'number;drop table users',
    'number,module,mass',
    'number,-number',
    ',',
    '--number',
  ])('refuses to sort by “%s”, naming the field', (sort) => {
    const parse = () => parseListQuery({ sort }, SORTS);
    expect(parse).toThrow(ProblemError);
    expect(parse).toThrow(
      expect.objectContaining({ statusCode: 400, errors: [expect.objectContaining({ field: 'sort' })] }),
    );
  });

  it.each([
    { page: '0' },
    { page: '-1' },
    { page: '1.5' },
    { page: 'x' },
    { page: '' },
    { page: ['1', '2'] },
  ])('refuses %o', (query) => expect(fieldsAtFault(query)).toEqual(['page']));

  it('refuses a page of more than 100 and text of more than 200 characters', () => {
    expect(fieldsAtFault({ size: '101', text: 'x'.repeat(201) })).toEqual(['size', 'text']);
  });
});
