import { Global, Injectable, Module } from '@nestjs/common';

/** The only source of the present time, so that tests can move it. */
@Injectable()
export class Clock {
  now(): Date {
    return new Date();
  }

  /** The present moment as the database and the API write it: ISO 8601, UTC, milliseconds. */
  iso(): string {
    return this.now().toISOString();
  }
}

@Global()
@Module({ providers: [Clock], exports: [Clock] })
export class ClockModule {}
