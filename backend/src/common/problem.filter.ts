import { type ArgumentsHost, Catch, type ExceptionFilter, HttpException } from '@nestjs/common';
import { DomainError } from '@stageyard/libs/units';
import { type FastifyReply, type FastifyRequest } from 'fastify';
import { QueryFailedError } from 'typeorm';
import { storageProblem } from '../database/storage-problem.js';
import { ProblemError } from './errors.js';
import { problemBody } from './problem-body.js';

const BY_STATUS: Record<number, [code: string, message: string]> = {
  400: ['bad-request', 'The request cannot be read. Check its address and its content.'],
  404: ['not-found', 'There is nothing at this address. Check it, or start again from the first page.'],
  405: ['not-allowed', 'This address does not take this kind of request.'],
  413: ['too-large', 'The request is larger than 1 MiB, the most the server takes. Send less at once.'],
  414: ['too-long', 'The address is too long.'],
  415: ['unsupported-type', 'The content must be sent as application/json.'],
  429: ['too-many-requests', 'Too many requests. Wait a minute, then try again.'],
  503: ['unavailable', 'The server cannot answer just now. Try again in a minute.'],
};

const BY_CAUSE: Record<string, [code: string, message: string]> = {
  FST_ERR_CTP_EMPTY_JSON_BODY: ['bad-json', 'The request has no content, but says it sends JSON.'],
  FST_ERR_CTP_INVALID_JSON_BODY: ['bad-json', 'The content of the request is not valid JSON.'],
  FST_ERR_CTP_INVALID_CONTENT_LENGTH: ['bad-request', 'The content is not as long as its header says.'],
};

/** Turns whatever was thrown into the one shape of refusals. What was not foreseen tells nothing of the inside. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  catch(thrown: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp();
    const request = http.getRequest<FastifyRequest>();
    const reply = http.getResponse<FastifyReply>();
    const problem = toProblem(thrown);
    if (problem.statusCode >= 500 && problem !== thrown) request.log.error({ err: thrown }, 'Request failed');
    if (reply.sent || reply.raw.headersSent) {
      reply.raw.end();
      return;
    }
    const wait = problem.extra.retryAfterSeconds;
    if (typeof wait === 'number') void reply.header('retry-after', String(wait));
    void reply.status(problem.statusCode).send(problemBody(problem, String(request.id)));
  }
}

/** The refusal behind anything thrown. */
export function toProblem(thrown: unknown): ProblemError {
  if (thrown instanceof ProblemError) return thrown;
  if (thrown instanceof DomainError) {
    return new ProblemError(400, thrown.code, thrown.message, { errors: thrown.errors });
  }
  const status = statusOf(thrown);
  const known = BY_CAUSE[causeCode(thrown)] ?? BY_STATUS[status];
  if (known && status < 500) return new ProblemError(status, ...known);
  if (status < 500) return new ProblemError(status, 'refused', 'The server does not take this request.');
  const problem = thrown instanceof QueryFailedError ? storageProblem(thrown) : null;
  if (problem !== null) {
    const message = `The server cannot use its data folder, so nothing was saved. ${problem} Then try again.`;
    return new ProblemError(503, 'storage', message);
  }
  const message =
    'Something went wrong on the server. Nothing was saved. Try again, and report the request number.';
  return new ProblemError(500, 'server-error', message);
}

function statusOf(thrown: unknown): number {
  if (thrown instanceof HttpException) return thrown.getStatus();
  if (thrown instanceof SyntaxError && 'statusCode' in thrown) return 400;
  const status = thrown instanceof Error && 'statusCode' in thrown ? thrown.statusCode : 500;
  return typeof status === 'number' && status >= 400 && status < 600 ? status : 500;
}

function causeCode(thrown: unknown): string {
  const cause = thrown instanceof HttpException ? thrown.cause : thrown;
  if (!(cause instanceof Error)) return '';
  if (cause instanceof SyntaxError) return 'FST_ERR_CTP_INVALID_JSON_BODY';
  return 'code' in cause && typeof cause.code === 'string' ? cause.code : '';
}
