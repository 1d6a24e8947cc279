import 'reflect-metadata';
import { writeFileSync } from 'node:fs';
import { NestFactory } from '@nestjs/core';
import { FastifyAdapter, type NestFastifyApplication } from '@nestjs/platform-fastify';
import { AppModule } from './app.module.js';
import { apiDocument } from './openapi-document.js';
import { loadSettings } from './settings/settings.js';

/** The OpenAPI document as text, made without a database or a port. */
export async function renderApiDocument(): Promise<string> {
  const app = await NestFactory.create<NestFastifyApplication>(
    AppModule.with(loadSettings({})),
    new FastifyAdapter(),
    { preview: true, logger: false, abortOnError: false },
  );
  app.setGlobalPrefix('api');
  const text = `${JSON.stringify(apiDocument(app), null, 2)}\n`;
  await app.close();
  return text;
}

const [, script, target] = process.argv;
if (script === import.meta.filename) writeFileSync(target ?? 'openapi.json', await renderApiDocument());
