import { request } from 'node:http';
import { Controller, Get, Module } from '@nestjs/common';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Client, startServer, type TestServer } from './harness.js';

interface ProblemBody {
  statusCode: number;
  code: string;
  message: string;
  errors?: { field: string; value: unknown; limit?: unknown; message: string }[];
  requestId: string;
}

let server: TestServer;
let admin: Client;
beforeAll(async () => {
  server = await startServer();
  admin = await server.as('admin');
});
afterAll(() => server.close());

const person = {
  name: 'Somebody',
  email: 'somebody@brackenbay.example',
  roles: ['viewer'],
  password: 'long enough',
};

async function refusal(body: unknown): Promise<ProblemBody> {
  const answer = await admin.send<ProblemBody>('POST', '/api/users', { body });
  expect(answer.status).toBe(answer.body.statusCode);
  expect(answer.bytes.toString()).not.toMatch(/node_modules|\.ts:|\.js:|at .*\(/);
  return answer.body;
}

describe('a refusal', () => {
  it('of an unknown address says so, and its number is in the header too', async () => {
    const answer = await admin.get<ProblemBody>('/api/no-such-thing');
    expect(answer.status).toBe(404);
    expect(answer.body.code).toBe('not-found');
    expect(answer.headers.get('x-request-id')).toBe(answer.body.requestId);
  });

  it('of an unknown person names what was asked for', async () => {
    const answer = await admin.patch<ProblemBody>('/api/users/nobody-here', { version: 1 });
    expect(answer.status).toBe(404);
    expect(answer.body.message).toContain('nobody-here');
  });

  it('of content that is no JSON tells so', async () => {
    expect(await refusal('{"name": ')).toMatchObject({ statusCode: 400, code: 'bad-json' });
    expect(await refusal('')).toMatchObject({ statusCode: 400 });
    expect(await refusal('[]')).toMatchObject({ statusCode: 400 });
    expect(await refusal('null')).toMatchObject({ statusCode: 400 });
    expect(await refusal('"text"')).toMatchObject({ statusCode: 400 });
  });

  it('of content in another form asks for JSON', async () => {
    const answer = await admin.send<ProblemBody>('POST', '/api/users', {
      body: '<person/>',
      headers: { 'content-type': 'application/xml' },
    });
    expect([answer.status, answer.body.code]).toEqual([415, 'unsupported-type']);
  });

  it('of more than 1 MiB gives the limit', async () => {
    const problem = await refusal({ ...person, name: 'x'.repeat(1024 * 1024) });
    expect(problem).toMatchObject({ statusCode: 413, code: 'too-large' });
    expect(problem.message).toContain('1 MiB');
  });

  it('of a text of 100,000 characters names the field and the limit, and does not send the text back', async () => {
    const problem = await refusal({ ...person, name: 'x'.repeat(100_000) });
    expect(problem.statusCode).toBe(400);
    expect(problem.errors).toMatchObject([{ field: 'name', limit: 120 }]);
    expect(problem.message).toContain('100,000');
    expect(JSON.stringify(problem).length).toBeLessThan(1000);
  });

  it('of an unknown field names it', async () => {
    const problem = await refusal({ ...person, active: true, passwordHash: 'x' });
    expect(problem.errors?.map(({ field }) => field).sort()).toEqual(['active', 'passwordHash']);
  });

  it('of a prototype in disguise is a plain 400', async () => {
    expect(await refusal('{"__proto__": {"admin": true}}')).toMatchObject({ statusCode: 400 });
  });

  it('names every field at fault at once, each with what it must be', async () => {
    const problem = await refusal({ name: ' ', email: 'nobody', roles: ['owner'], password: 'short' });
    const fields = problem.errors?.map(({ field }) => field).sort();
    expect(fields).toEqual(['email', 'name', 'password', 'roles']);
    for (const { message } of problem.errors ?? []) expect(message).toMatch(/^.{10,}[.]$/);
    expect(problem.errors?.find(({ field }) => field === 'password')).toMatchObject({
      value: null,
      limit: 10,
    });
  });

  it('of a query parameter given twice or unknown is a plain 400', async () => {
    for (const query of [
      'page=1&page=2',
      'nonsense=1',
      'size=101',
      'sort=passwordHash',
      'page=1e9',
      'text[]=x',
    ]) {
      const answer = await admin.get<ProblemBody>(`/api/users?${query}`);
      expect([query, answer.status]).toEqual([query, 400]);
      expect(answer.body.errors?.length).toBeGreaterThan(0);
    }
  });

  it('of a malformed address has the same shape', async () => {
    const { hostname, port } = new URL(server.url);
    const text = await new Promise<string>((resolve, reject) => {
      request({ hostname, port, path: '/api/users/%E0%A4%A' }, (response) => {
        let body = '';
        response.on('data', (chunk) => (body += String(chunk))).on('end', () => resolve(body));
      })
        .on('error', reject)
        .end();
    });
    expect(JSON.parse(text)).toMatchObject({ statusCode: 400, code: 'bad-request' });
  });
});

describe('a mistake inside the server', () => {
  it('answers 500 and tells nothing of the inside', async () => {
    const { ProblemFilter } = await import('../src/common/problem.filter.js');
    const { NestFactory } = await import('@nestjs/core');
    const { FastifyAdapter } = await import('@nestjs/platform-fastify');

    @Controller('broken')
    class BrokenController {
      @Get()
      read(): never {
        throw new TypeError('SELECT secret FROM inside');
      }
    }
    @Module({ controllers: [BrokenController] })
    class BrokenModule {}

    const app = await NestFactory.create(BrokenModule, new FastifyAdapter(), { logger: false });
    app.useGlobalFilters(new ProblemFilter());
    await app.listen(0, '127.0.0.1');
    const response = await fetch(`${await app.getUrl()}/broken`);
    const text = await response.text();
    await app.close();
    expect(response.status).toBe(500);
    expect(JSON.parse(text)).toMatchObject({ statusCode: 500, code: 'server-error' });
    expect(text).not.toMatch(/secret|TypeError|\.ts|stack/);
  });
});

describe('health', () => {
  it('answers 200 while the database answers, 503 when it does not', async () => {
    const other = await startServer();
    expect((await other.anonymous().get('/api/health')).body).toEqual({ status: 'ok' });
    const { DataSource } = await import('typeorm');
    await other.app.get(DataSource).destroy();
    const answer = await other.anonymous().get<ProblemBody>('/api/health');
    expect([answer.status, answer.body.code]).toEqual([503, 'unavailable']);
    await other.close();
  });
});
