import { Brackets, type DataSource, type SelectQueryBuilder } from 'typeorm';
import { type ReadStatement } from '../database/read-task.js';
import { type Part } from './entities/part.entity.js';

/** Words beyond these are left out of account: they would only slow the search down. */
const MOST_WORDS = 8;

/** The trigram index finds words of at least three characters. */
const SHORTEST_INDEXED = 3;

/** A text that stands in more parts than this is found sooner by walking the library in the order of the list. */
const MANY = 5000;

/** The words of a text that a person typed; control characters would mean an end of text to the database. */
function wordsOf(text: string): string[] {
  return text
    .split(/[\s\p{Cc}]+/u)
    .filter(Boolean)
    .slice(0, MOST_WORDS);
}

const isIndexed = (word: string) => [...word].length >= SHORTEST_INDEXED;
/** Beyond these letters only the index takes capitals and small letters for the same. */
const isPlain = (word: string) => /^[ -~]*$/.test(word);

export interface TextSearchOptions {
  many?: number;
  countOf?: (statement: ReadStatement) => Promise<number>;
}

const countBy =
  (source: DataSource) =>
  async ({ sql, params }: ReadStatement): Promise<number> => {
    const [found] = await source.query<{ count: number }[]>(sql, [...params]);
    return found?.count ?? 0;
  };

/**
 * Narrows a query over parts (alias `part`) to those whose number or description holds every word of the text,
 * wherever it stands and whatever its case. Rare words are looked up in the trigram index; common and short ones are
 * looked for part by part.
 * @param options `many`: matches from which on words count as common; `countOf`: counts by a statement whose one answer
 * is `count`, here and now when left out
 */
export async function narrowToText(
  rows: SelectQueryBuilder<Part>,
  text: string,
  { many = MANY, countOf = countBy(rows.connection) }: TextSearchOptions = {},
): Promise<void> {
  const words = wordsOf(text);
  const indexed = words.filter(isIndexed);
  if (indexed.length > 0 && !(indexed.every(isPlain) && (await countOf(matchesOf(indexed, many))) >= many)) {
    matchIndexed(rows, indexed);
    matchPartByPart(
      rows,
      words.filter((word) => !isIndexed(word)),
    );
  } else {
    matchPartByPart(rows, words);
  }
}

/** As `narrowToText`, where any `enough` of the parts will do; nothing matches a text without words. */
export function narrowToAnyOf(rows: SelectQueryBuilder<Part>, text: string, enough: number): void {
  const words = wordsOf(text);
  if (words.length === 0) rows.andWhere('0 = 1');
  else if (words.every(isIndexed)) matchIndexed(rows, words, enough);
  else matchPartByPart(rows, words);
  rows.limit(enough);
}

/** Counts the parts that the index finds, no further than `most`. */
function matchesOf(words: string[], most: number): ReadStatement {
  return {
    sql: `SELECT COUNT(*) AS "count" FROM (SELECT 1 FROM "part_search" WHERE "part_search" MATCH ? LIMIT ?)`,
    params: [matchOf(words), most],
  };
}

function matchIndexed(rows: SelectQueryBuilder<Part>, words: string[], enough?: number): void {
  const limit = enough === undefined ? '' : 'LIMIT :enough';
  rows.andWhere(`part.id IN (SELECT "rowid" FROM "part_search" WHERE "part_search" MATCH :match ${limit})`, {
    match: matchOf(words),
    ...(enough === undefined ? {} : { enough }),
  });
}

function matchPartByPart(rows: SelectQueryBuilder<Part>, words: string[]): void {
  words.forEach((word, index) => {
    const name = `word${index}`;
    const holds = new Brackets((either) =>
      either
        .where(`part.number LIKE :${name} ESCAPE '\\'`)
        .orWhere(`part.description LIKE :${name} ESCAPE '\\'`),
    );
    rows.andWhere(holds, { [name]: `%${word.replace(/[\\%_]/g, '\\$&')}%` });
  });
}

/** Every word as the index takes it literally: none of its signs means anything. */
function matchOf(words: string[]): string {
  return words.map((word) => `"${word.replaceAll('"', '""')}"`).join(' AND ');
}
