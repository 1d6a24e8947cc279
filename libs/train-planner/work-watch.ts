import { type SearchControl } from './train-option.js';

/** Thrown inside a search to leave all its loops at once; never leaves the planner. */
export class SearchEnded extends Error {}

/** Steps of a few microseconds at most between two looks at the clock. */
const STEPS_PER_LOOK = 1024;
const REPORT_EVERY_MS = 40;

/** Counts the work of a search, reports its progress and ends it when asked to or when its time is over. */
export class WorkWatch {
  readonly #control: SearchControl;
  readonly #start: number;
  #lastReport: number;
  #sinceLook = 0;
  #stepsLeft = Infinity;
  #phase = { name: '', stages: 0, total: 0, settledBefore: 0 };
  settled = 0;
  /** How many trains the search holds; asked for every report. */
  found: () => number = () => 0;
  /** Counted in whole looks at the clock. */
  stepsTaken = 0;

  constructor(control: SearchControl) {
    this.#control = control;
    this.#start = this.#now();
    this.#lastReport = this.#start;
  }

  elapsedMs(): number {
    return this.#now() - this.#start;
  }

  beginPhase(name: string, stages: number, total: number): void {
    this.#phase = { name, stages, total, settledBefore: this.settled };
    this.#report();
  }

  /** Runs with a budget of steps of its own. Steps, not time, so that the outcome is the same on every machine. */
  withStepLimit<T>(steps: number, run: () => T): T | 'over-budget' {
    this.#stepsLeft = steps;
    try {
      return run();
    } catch (error) {
      if (error instanceof SearchEnded && this.#stepsLeft <= 0) return 'over-budget';
      throw error;
    } finally {
      this.#stepsLeft = Infinity;
    }
  }

  /** Called once a small step of work. @throws SearchEnded */
  step(): void {
    if (++this.#sinceLook < STEPS_PER_LOOK) return;
    this.#sinceLook = 0;
    this.stepsTaken += STEPS_PER_LOOK;
    this.#stepsLeft -= STEPS_PER_LOOK;
    if (this.#stepsLeft <= 0) throw new SearchEnded();
    this.look();
  }

  /** Looks at the clock and the stop signal now. @throws SearchEnded */
  look(): void {
    const now = this.#now();
    if (now - this.#lastReport >= REPORT_EVERY_MS) this.#report();
    const { timeLimitMs } = this.#control;
    if (timeLimitMs !== undefined && now - this.#start >= timeLimitMs) throw new SearchEnded();
    if (this.#control.shouldStop?.()) throw new SearchEnded();
  }

  #report(): void {
    this.#lastReport = this.#now();
    const { name, stages, total, settledBefore } = this.#phase;
    const settled = this.settled - settledBefore;
    this.#control.onProgress?.({ phase: name, stages, settled, total, found: this.found() });
  }

  #now(): number {
    return this.#control.now ? this.#control.now() : Date.now();
  }
}
