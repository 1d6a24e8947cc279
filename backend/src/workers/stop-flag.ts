/**
 * A request to stop that a worker thread can see while it is busy: one shared word, 0 or 1. A busy thread reads no
 * messages, so a message could not stop it.
 */
export class StopFlag {
  /** Handed to the worker as it is: both sides look at the same memory. */
  readonly shared = new Int32Array(new SharedArrayBuffer(Int32Array.BYTES_PER_ELEMENT));
  private readonly listeners = new Set<() => void>();

  get raised(): boolean {
    return Atomics.load(this.shared, 0) !== 0;
  }

  raise(): void {
    if (this.raised) return;
    Atomics.store(this.shared, 0, 1);
    for (const listener of this.listeners) listener();
  }

  /** Calls back on this thread when the flag is raised; returns the way to forget it. */
  onRaise(listener: () => void): () => void {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  }
}
