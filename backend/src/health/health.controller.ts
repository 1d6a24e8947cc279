import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiResponse, ApiTags } from '@nestjs/swagger';
import { DataSource } from 'typeorm';
import { Public } from '../auth/allow.decorator.js';
import { Problem } from '../common/dto/problem.js';
import { ProblemError } from '../common/errors.js';
import { Health } from './dto/health.js';

@ApiTags('health')
@Controller('health')
export class HealthController {
  constructor(private readonly source: DataSource) {}

  /** Whether the server can do its work: the database answers. */
  @Get()
  @Public()
  @ApiOkResponse({ type: Health })
  @ApiResponse({ status: 503, type: Problem })
  async check(): Promise<Health> {
    try {
      await this.source.query('SELECT 1 FROM "users" LIMIT 1');
    } catch {
      throw new ProblemError(503, 'unavailable', 'The database does not answer. Look into the server log.');
    }
    return { status: 'ok' };
  }
}
