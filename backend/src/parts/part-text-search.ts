import { Brackets, type ObjectLiteral, type SelectQueryBuilder } from 'typeorm';

/** Words beyond these are left out of account: they would only slow the search down. */
const MOST_WORDS = 8;
/** The trigram index finds words of at least three characters. */
const SHORTEST_INDEXED = 3;

/**
 * Narrows a query over parts (alias `part`) to those whose number or description holds every word of the text,
 * wherever it stands and whatever its case. Long words use the trigram index, short ones the text itself.
 * @param enough when the caller needs no more parts than this, in any order, and filters by nothing else
 */
export function matchText<T extends ObjectLiteral>(
  query: SelectQueryBuilder<T>,
  text: string,
  enough?: number,
): void {
  // Control characters mean an end of text to the database.
  const words = text
    .split(/[\s\p{Cc}]+/u)
    .filter(Boolean)
    .slice(0, MOST_WORDS);
  const indexed = words.filter((word) => [...word].length >= SHORTEST_INDEXED);
  const limit = enough !== undefined && indexed.length === words.length ? `LIMIT ${enough}` : '';
  if (indexed.length > 0) {
    query.andWhere(
      `part.id IN (SELECT "rowid" FROM "part_search" WHERE "part_search" MATCH :match ${limit})`,
      { match: indexed.map(quoted).join(' AND ') },
    );
  }
  words
    .filter((word) => [...word].length < SHORTEST_INDEXED)
    .forEach((word, index) => {
      const name = `word${index}`;
      query.andWhere(
        new Brackets((either) =>
          either
            .where(`part.number LIKE :${name} ESCAPE '\\'`)
            .orWhere(`part.description LIKE :${name} ESCAPE '\\'`),
        ),
        { [name]: `%${word.replace(/[\\%_]/g, '\\$&')}%` },
      );
    });
}

/** A word as the index takes it literally: none of its signs means anything. */
function quoted(word: string): string {
  return `"${word.replaceAll('"', '""')}"`;
}
