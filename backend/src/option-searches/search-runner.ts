import {
  type BeforeApplicationShutdown,
  Injectable,
  Logger,
  type OnApplicationBootstrap,
} from '@nestjs/common';
import { type SearchOutcome } from '@stageyard/libs/train-planner';
import { DomainError } from '@stageyard/libs/units';
import { In } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { Brief } from '../briefs/entities/brief.entity.js';
import { optionRequestOf } from '../briefs/requirement.js';
import { Clock } from '../common/clock.js';
import { WriteQueue } from '../database/write-queue.js';
import { SearchCrashed, SearchPool } from '../workers/search-pool.js';
import { type SearchSummaryDto } from './dto/search-summary.dto.js';
import { OptionSearch, type SearchState, UNFINISHED_STATES } from './entities/option-search.entity.js';
import { LiveSearch } from './live-search.js';
import { HEARTBEAT_MS, SEARCH_TIME_LIMIT_MS, SERVER_STOPPED } from './search-limits.js';

type Ending = Pick<OptionSearch, 'state' | 'message' | 'outcome' | 'optionCount' | 'complete'>;

/** Runs searches on the worker threads and writes down how they end. */
@Injectable()
export class SearchRunner implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger(SearchRunner.name);
  private readonly live = new Map<number, LiveSearch>();
  private closing = false;

  constructor(
    private readonly pool: SearchPool,
    private readonly writes: WriteQueue,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  /** Searches that a dead server left behind are nobody's any more: they say so instead of running for ever. */
  async onApplicationBootstrap(): Promise<void> {
    await this.failUnfinished();
  }

  /** Lets go of everything that runs, before the database closes. */
  async beforeApplicationShutdown(): Promise<void> {
    this.closing = true;
    if (this.live.size > 0) await this.failUnfinished();
    for (const search of this.live.values()) {
      search.changeTo({ state: 'failed', message: SERVER_STOPPED, finishedAt: this.clock.iso() });
      search.close();
      search.stopFlag.raise();
    }
  }

  find(searchId: number): LiveSearch | undefined {
    return this.live.get(searchId);
  }

  /** Begins a search that stands in the database as `queued`; returns at once. */
  launch(search: OptionSearch, summary: SearchSummaryDto, actor: SignedInUser): void {
    const live = new LiveSearch(summary, HEARTBEAT_MS);
    this.live.set(search.id, live);
    void this.work(search, live, actor)
      .catch((error: unknown) =>
        this.logger.error({ err: error }, `Search ${search.id} could not be written down`),
      )
      .finally(() => {
        live.close();
        this.live.delete(search.id);
      });
  }

  private async work(search: OptionSearch, live: LiveSearch, actor: SignedInUser): Promise<void> {
    const ending = await this.pool
      .run(optionRequestOf(search.request), {
        timeLimitMs: SEARCH_TIME_LIMIT_MS,
        stopFlag: live.stopFlag,
        onStart: () => this.markRunning(search.id, live),
        onProgress: (progress) => live.report(progress),
      })
      .then((outcome) => endingOf(outcome, live.stopFlag.raised))
      .catch((error: unknown) => this.failure(search.id, error));
    if (this.closing) return;
    const finishedAt = this.clock.iso();
    await this.finish(search, { ...ending, finishedAt }, actor);
    const { state, message, optionCount, complete } = ending;
    live.changeTo({ state, message, optionCount, complete, finishedAt });
  }

  private markRunning(id: number, live: LiveSearch): void {
    live.changeTo({ state: 'running' });
    this.writes
      .run((manager) => manager.update(OptionSearch, { id, state: 'queued' }, { state: 'running' }))
      .catch((error: unknown) =>
        this.logger.error({ err: error }, `Search ${id} could not be marked as running`),
      );
  }

  private failure(id: number, error: unknown): Ending {
    if (!this.closing) this.logger.error({ err: error }, `Search ${id} failed`);
    const known = error instanceof SearchCrashed || error instanceof DomainError;
    const message = known ? error.message : 'The search failed. Start it again.';
    return { state: 'failed', message, outcome: null, optionCount: null, complete: null };
  }

  private async finish(
    search: OptionSearch,
    ending: Ending & { finishedAt: string },
    actor: SignedInUser,
  ): Promise<void> {
    const { id, briefId, briefVersion } = search;
    await this.writes.run(async (manager) => {
      const brief = await manager.findOneByOrFail(Brief, { id: briefId });
      await manager.update(OptionSearch, { id }, ending);
      if (ending.state === 'done') {
        // Not an edit: the version stays, so nobody who edits meanwhile is sent away.
        const searched = { id: briefId, version: briefVersion, standing: 'open' as const };
        await manager.update(Brief, searched, { standing: 'searched' });
      }
      const { state, optionCount, complete, message } = ending;
      await this.audit.record(manager, {
        actor,
        action: `search ${state}`,
        entity: 'brief',
        entityId: brief.code,
        summary: `${endingSummary(state, optionCount)} for ${brief.code}`,
        after: { searchId: String(id), state, optionCount, complete, message },
      });
    });
  }

  private async failUnfinished(): Promise<void> {
    await this.writes.run((manager) =>
      manager.update(
        OptionSearch,
        { state: In([...UNFINISHED_STATES]) },
        { state: 'failed', message: SERVER_STOPPED, finishedAt: this.clock.iso() },
      ),
    );
  }
}

function endingOf(outcome: SearchOutcome, stopped: boolean): Ending {
  const { complete } = outcome.search;
  const figures = { outcome, optionCount: outcome.options.length, complete };
  if (complete) return { state: 'done', message: null, ...figures };
  if (stopped) {
    return { state: 'stopped', message: 'Stopped before every combination was settled.', ...figures };
  }
  const seconds = SEARCH_TIME_LIMIT_MS / 1000;
  const message = `The time limit of ${seconds} s was reached before every combination was settled. Narrow the brief for a full answer.`;
  return { state: 'done', message, ...figures };
}

function endingSummary(state: SearchState, optionCount: number | null): string {
  if (state === 'failed') return 'Search failed';
  const found = optionCount === 1 ? '1 option' : `${optionCount ?? 0} options`;
  return `Search ${state}: ${found}`;
}
