import type { Port } from '../../protocol/port';

/** A worker that runs, on whatever platform. */
export interface RunningWorker extends Port {
  /** Called once when it has ended, by itself or because it was ended. */
  onEnd(listener: (reason: string) => void): void;
  end(): void;
}
