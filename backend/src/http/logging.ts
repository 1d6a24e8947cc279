import { type LoggerService } from '@nestjs/common';
import { type FastifyBaseLogger, type FastifyInstance } from 'fastify';
import { pino } from 'pino';
import { type LogLevel } from '../settings/settings.js';

/** One JSON line an event on standard output. Requests are named without query, cookies or content. */
export function createLogger(level: LogLevel): FastifyBaseLogger {
  return pino({
    level,
    base: null,
    timestamp: pino.stdTimeFunctions.isoTime,
    serializers: {
      req: (request: { method?: string; url?: string }) => ({
        method: request.method,
        path: pathOf(request.url ?? ''),
      }),
    },
  });
}

type Level = 'fatal' | 'error' | 'warn' | 'info' | 'debug' | 'trace';

/** Nest's own messages, on the same log. What it says about each module and route at start is for debugging. */
export function nestLogger(log: FastifyBaseLogger): LoggerService {
  // Why the server cannot start is said in one sentence by the entry; the stack is for debugging.
  const levelOf = (level: Level, place: unknown) => (place === 'ExceptionHandler' ? 'debug' : level);
  const write =
    (given: Level) =>
    (message: unknown, ...rest: unknown[]) => {
      const place = typeof rest.at(-1) === 'string' ? rest.at(-1) : undefined;
      const level = levelOf(given, place);
      if (message instanceof Error) log[level]({ err: message, place }, message.message);
      else log[level]({ place, ...(rest.length > 1 && { detail: rest[0] }) }, String(message));
    };
  return {
    fatal: write('fatal'),
    error: write('error'),
    warn: write('warn'),
    log: write('debug'),
    debug: write('debug'),
    verbose: write('trace'),
  };
}

/** One line for each answer of the API, with the request's number and the person. */
export function logAnswers(server: FastifyInstance): void {
  server.addHook('onResponse', (request, reply, done) => {
    const path = pathOf(request.url);
    const facts = {
      method: request.method,
      path,
      status: reply.statusCode,
      ms: Math.round(reply.elapsedTime),
      person: request.person?.id,
    };
    if (path.startsWith('/api/')) request.log.info(facts, 'answered');
    else request.log.debug(facts, 'answered');
    done();
  });
}

function pathOf(url: string): string {
  return url.split('?', 1)[0] ?? '';
}
