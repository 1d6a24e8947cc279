import 'reflect-metadata';
import { randomUUID } from 'node:crypto';
import fastifyCookie from '@fastify/cookie';
import fastifyHelmet from '@fastify/helmet';
import { NestFactory } from '@nestjs/core';
import { FastifyAdapter, type NestFastifyApplication } from '@nestjs/platform-fastify';
import { type FastifyInstance, type FastifyReply, type FastifyRequest, LogController } from 'fastify';
import { AppModule } from './app.module.js';
import { problemBody } from './common/problem-body.js';
import { ProblemFilter, toProblem } from './common/problem.filter.js';
import { inputPipe } from './common/validation.js';
import { serveApiDocs } from './http/api-docs.js';
import { createLogger, logAnswers, nestLogger } from './http/logging.js';
import { refuseForeignWrites, refuseFromAfar } from './http/request-rules.js';
import { serveScreens } from './http/screens.js';
import { securityHeaders } from './http/security-headers.js';
import { type Settings } from './settings/settings.js';

const BODY_LIMIT = 1024 * 1024;
const REQUEST_TIMEOUT_MS = 60_000;
const CLOSE_TIMEOUT_MS = 3_000;

/**
 * The whole server, ready to listen: database migrated, routes checked, front end served if it is built.
 * @throws Error when the data folder cannot be used or a route does not say who may call it
 */
export async function createApp(settings: Settings): Promise<NestFastifyApplication> {
  const log = createLogger(settings.logLevel);
  const adapter = new FastifyAdapter({
    loggerInstance: log,
    logController: new LogController({ disableRequestLogging: true, requestIdLogLabel: 'requestId' }),
    bodyLimit: BODY_LIMIT,
    requestTimeout: REQUEST_TIMEOUT_MS,
    // Behind a proxy on this machine, the throttle must see who really asked.
    trustProxy: settings.demo ? false : 'loopback',
    genReqId: () => randomUUID(),
    routerOptions: { maxParamLength: 200 },
    frameworkErrors: (error: Error, request: FastifyRequest, reply: FastifyReply) => {
      const problem = toProblem(error);
      void reply.status(problem.statusCode).send(problemBody(problem, String(request.id)));
    },
  });
  const app = await NestFactory.create<NestFastifyApplication>(AppModule.with(settings), adapter, {
    logger: nestLogger(log),
    abortOnError: false,
  });
  const server = app.getHttpAdapter().getInstance();
  addRequestRules(server, settings);
  logAnswers(server);
  closeInTime(server);
  await app.register(fastifyCookie);
  await app.register(fastifyHelmet, securityHeaders(settings));
  app.setGlobalPrefix('api');
  app.useGlobalPipes(inputPipe());
  app.useGlobalFilters(new ProblemFilter());
  serveApiDocs(app, settings);
  await serveScreens(server);
  await app.init();
  await server.ready();
  return app;
}

function addRequestRules(server: FastifyInstance, settings: Settings): void {
  server.addHook('onRequest', (request, reply, done) => {
    void reply.header('x-request-id', String(request.id));
    if (request.url.startsWith('/api/')) void reply.header('cache-control', 'no-store');
    const facts = factsOf(request);
    refuseFromAfar(facts, settings);
    refuseForeignWrites(facts, settings);
    done();
  });
}

function factsOf({ method, headers, socket }: FastifyRequest) {
  return { method, headers, peer: socket.remoteAddress };
}

/** Event streams stay open by design: at the end they get a moment, then they are cut. */
function closeInTime(server: FastifyInstance): void {
  server.addHook('preClose', (done) => {
    setTimeout(() => server.server.closeAllConnections(), CLOSE_TIMEOUT_MS).unref();
    done();
  });
}
