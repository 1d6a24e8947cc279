import { type MessageEvent } from '@nestjs/common';
import { Observable, Subject, finalize, interval, map, merge, of, takeUntil } from 'rxjs';
import { type SearchProgress } from '../workers/search-task.js';
import { StopFlag } from '../workers/stop-flag.js';
import { type SearchSummaryDto } from './dto/search-summary.dto.js';

/** A search under way in this process: its latest figures, its stop flag and those who watch it. */
export class LiveSearch {
  readonly stopFlag = new StopFlag();
  progress: SearchProgress | null = null;
  private readonly news = new Subject<MessageEvent>();
  private readonly ended = new Subject<void>();

  constructor(
    public summary: SearchSummaryDto,
    private readonly heartbeatMs: number,
  ) {}

  report(progress: SearchProgress): void {
    this.progress = progress;
    this.news.next(progressEvent(progress));
  }

  changeTo(change: Partial<SearchSummaryDto>): void {
    this.summary = { ...this.summary, ...change };
    this.news.next(stateEvent(this.summary));
  }

  /** Ends every stream that watches. */
  close(): void {
    this.ended.next();
    this.news.complete();
    this.ended.complete();
  }

  /** The present state first, so that a page that comes back knows where things are; then what happens. */
  watch(): Observable<MessageEvent> {
    return new Observable<MessageEvent>((watcher) => {
      watcher.next(stateEvent(this.summary));
      if (this.progress) watcher.next(progressEvent(this.progress));
      const heartbeat = interval(this.heartbeatMs).pipe(
        map((): MessageEvent => ({ comment: 'still here' })),
        takeUntil(this.ended),
      );
      return merge(this.news, heartbeat)
        .pipe(finalize(() => watcher.complete()))
        .subscribe(watcher);
    });
  }
}

/** The stream of a search that has ended: its state, and nothing more. */
export function endedStream(summary: SearchSummaryDto): Observable<MessageEvent> {
  return of(stateEvent(summary));
}

function stateEvent(summary: SearchSummaryDto): MessageEvent {
  return { type: 'state', data: summary };
}

function progressEvent(progress: SearchProgress): MessageEvent {
  return { type: 'progress', data: progress };
}
