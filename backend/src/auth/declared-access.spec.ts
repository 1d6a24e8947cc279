import { Controller, Get, Module, Post, type Type } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import { FastifyAdapter } from '@nestjs/platform-fastify';
import { describe, expect, it } from 'vitest';
import { AppModule } from '../app.module.js';
import { tempSettings } from '../testing/temp-settings.js';
import { Allow, Public } from './allow.decorator.js';

@Controller('forgotten')
class ForgottenController {
  @Get()
  @Public()
  open(): string {
    return 'declared';
  }

  @Post()
  forgotten(): string {
    return 'nobody said who may call this';
  }
}

@Controller('declared')
@Allow('parts.edit')
class DeclaredController {
  @Get()
  read(): string {
    return 'declared on the class';
  }
}

@Module({ controllers: [ForgottenController] })
class ForgottenModule {}

@Module({ controllers: [DeclaredController] })
class DeclaredModule {}

async function start(extra: Type): Promise<void> {
  const { settings, remove } = tempSettings();
  const root = { module: class Root {}, imports: [AppModule.with(settings), extra] };
  const app = await NestFactory.create(root, new FastifyAdapter(), { logger: false, abortOnError: false });
  try {
    await app.init();
  } finally {
    await app.close();
    remove();
  }
}

describe('a server', () => {
  it('refuses to start with a route that does not say who may call it, and names the route', async () => {
    await expect(start(ForgottenModule)).rejects.toThrow('ForgottenController.forgotten (POST)');
  });

  it('starts when every route says so, itself or through its class', async () => {
    await expect(start(DeclaredModule)).resolves.toBeUndefined();
  });
});
