import { Global, Injectable, Module } from '@nestjs/common';
import { calendarDay } from '@stageyard/libs/bill-of-materials';

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

  /**
   * Today where the server stands, ISO 8601 date. Offers begin and end, and prices age, with the days of the workshop's
   * calendar: by UTC, an offer entered on a morning far east would not be valid before noon.
   */
  today(): string {
    return calendarDay(this.now());
  }
}

@Global()
@Module({ providers: [Clock], exports: [Clock] })
export class ClockModule {}
