import path from 'node:path';
import Database from 'better-sqlite3';

const CACHE_KIB = 64 * 1024;

/** The same lists straight through the driver: filter, sort, page and count, whole rows with their attributes parsed. */
export function openBare(dataDir) {
  const database = new Database(path.join(dataDir, 'stageyard.db'), { readonly: true });
  database.pragma(`cache_size = -${CACHE_KIB}`);
  return {
    /** A reader of one list: `where` and `order` are SQL, `values` belong to `where`. */
    list({ where = '1', order, values = [] }, size) {
      const rows = database.prepare(`SELECT * FROM "part" WHERE ${where} ORDER BY ${order} LIMIT ? OFFSET ?`);
      const count = database.prepare(`SELECT COUNT(*) AS "total" FROM "part" WHERE ${where}`);
      return (page) => {
        const items = rows.all(...values, size, (page - 1) * size);
        for (const item of items) item.attributes = JSON.parse(item.attributes);
        return { items, total: count.get(...values).total };
      };
    },
    close: () => database.close(),
  };
}
