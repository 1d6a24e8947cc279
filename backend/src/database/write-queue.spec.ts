import { statSync } from 'node:fs';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { type EntityManager } from 'typeorm';
import { openWritingSource } from './data-sources.js';
import { openTempDatabase, type TempDatabase } from '../testing/temp-database.js';
import { DATABASE_FILE } from './data-sources.js';
import { WriteLog } from './write-log.js';
import { UserEntity } from '../users/entities/user.entity.js';

let database: TempDatabase;
beforeEach(async () => {
  database = await openTempDatabase();
});
afterEach(() => database.close());

function user(id: string): UserEntity {
  const times = { createdAt: '2026-01-01T00:00:00.000Z', updatedAt: '2026-01-01T00:00:00.000Z' };
  const rest = { name: id, passwordHash: '-', roles: [], active: true, demo: false, version: 1 };
  return Object.assign(new UserEntity(), { id, email: `${id}@brackenbay.example`, ...rest, ...times });
}

const insert = (id: string) => (manager: EntityManager) => manager.insert(UserEntity, user(id));

async function ids(): Promise<string[]> {
  const rows = await database.source.getRepository(UserEntity).find({ order: { id: 'ASC' } });
  return rows.map(({ id }) => id);
}

describe('WriteQueue', () => {
  it('commits every one of many works started in the same moment', async () => {
    const names = Array.from({ length: 25 }, (_, index) => `u${String(index).padStart(2, '0')}`);
    await Promise.all(names.map((name) => database.queue.run(insert(name))));
    expect(await ids()).toEqual(names);
  });

  it('rolls a failing work back alone and tells its caller why', async () => {
    const before = database.queue.run(insert('a'));
    const failing = database.queue.run(async (manager) => {
      await insert('b')(manager);
      await new Promise((resolve) => setTimeout(resolve, 5));
      throw new Error('the reason');
    });
    const after = database.queue.run(insert('c'));
    await expect(failing).rejects.toThrow('the reason');
    await Promise.all([before, after]);
    expect(await ids()).toEqual(['a', 'c']);
  });

  it('says that a write is done only once it is on the disk, and tells when it could not get there', async () => {
    const events: string[] = [];
    const log = new WriteLog(path.join(database.dataDir, DATABASE_FILE));
    const toDisk = log.toDisk.bind(log);
    const spy = vi.spyOn(WriteLog.prototype, 'toDisk').mockImplementationOnce(async () => {
      events.push(`on its way: ${(await ids()).join()}`);
      await toDisk();
      events.push('on the disk');
    });
    await database.queue.run(insert('a')).then(() => events.push('done'));
    expect(events).toEqual(['on its way: a', 'on the disk', 'done']);
    spy.mockRejectedValueOnce(new Error('EIO'));
    await expect(database.queue.run(insert('b'))).rejects.toThrow('EIO');
    await database.queue.run(insert('c'));
    expect(spy).toHaveBeenCalledTimes(3);
    spy.mockRestore();
    await log.close();
  });

  it('runs one work at a time, in the order of the calls', async () => {
    const events: string[] = [];
    const work = (name: string) => async () => {
      events.push(`${name} begins`);
      await new Promise((resolve) => setTimeout(resolve, 3));
      events.push(`${name} ends`);
    };
    await Promise.all([database.queue.run(work('first')), database.queue.run(work('second'))]);
    expect(events).toEqual(['first begins', 'first ends', 'second begins', 'second ends']);
  });

  it('lets nobody read what is not committed, and does not hold readers up', async () => {
    await database.queue.run(async (manager) => {
      await insert('later')(manager);
      expect(await ids()).toEqual([]);
    });
    expect(await ids()).toEqual(['later']);
  });

  it('refuses a run inside a run, and rolls the outer one back when it does not catch that', async () => {
    const outer = database.queue.run(async (manager) => {
      await insert('outer')(manager);
      await database.queue.run(insert('inner'));
    });
    await expect(outer).rejects.toThrow('inside a write');
    expect(await ids()).toEqual([]);
    await database.queue.run(insert('next'));
    expect(await ids()).toEqual(['next']);
  });

  it('lets work that was only started inside a write queue its own write afterwards', async () => {
    let later: Promise<unknown> = Promise.resolve();
    await database.queue.run((manager) => {
      later = new Promise((resolve) => setTimeout(resolve, 10)).then(() =>
        database.queue.run(insert('later')),
      );
      return insert('first')(manager);
    });
    await later;
    expect(await ids()).toEqual(['first', 'later']);
  });

  it('gives a turn to a thread that writes, in the order of the calls, and takes it back when it fails', async () => {
    const events: string[] = [];
    const turn = async () => {
      events.push('turn begins');
      // Another connection can write: the queue itself holds no transaction meanwhile.
      const other = await openWritingSource(database.dataDir);
      await other.manager.insert(UserEntity, user('of the thread'));
      await other.destroy();
      events.push('turn ends');
    };
    const leased = database.queue.lease(turn);
    const after = database.queue.run(async (manager) => {
      events.push('write');
      await insert('after')(manager);
    });
    await Promise.all([leased, after]);
    expect(events).toEqual(['turn begins', 'turn ends', 'write']);
    expect(await ids()).toEqual(['after', 'of the thread']);
    await expect(database.queue.lease(() => Promise.reject(new Error('the reason')))).rejects.toThrow(
      'the reason',
    );
    await database.queue.run(insert('next'));
    expect(await ids()).toContain('next');
  });

  it('makes a stray save on the default source fail, with nothing written', async () => {
    await expect(database.source.getRepository(UserEntity).save(user('stray'))).rejects.toThrow(
      /readonly|read-only/i,
    );
    await expect(database.source.query(`DELETE FROM "users"`)).rejects.toThrow(/readonly|read-only/i);
    expect(await ids()).toEqual([]);
  });

  it('finishes what is queued before it closes, and takes nothing more', async () => {
    const queued = database.queue.run(insert('queued'));
    await database.queue.onApplicationShutdown();
    await expect(queued).resolves.toBeDefined();
    await expect(database.queue.run(insert('late'))).rejects.toThrow('closed');
    expect(await ids()).toEqual(['queued']);
    // Nothing is left beside the database file, though a reading connection is still open.
    expect(statSync(path.join(database.dataDir, `${DATABASE_FILE}-wal`)).size).toBe(0);
  });
});
