import type { LogOutputChannel } from 'vscode';
import type { ReadingFacts } from '../protocol/fromWorker';

/** What goes into the log: how a file was read, what was kept, how long it took; never the value of a cell. */
export class Log {
  constructor(private readonly channel: LogOutputChannel) {}

  read(readings: readonly ReadingFacts[], elapsedMs: number): void {
    for (const reading of readings) {
      const met = reading.met.map(([what, times]) => `${what} ${times}`).join(', ');
      this.channel.info(
        `${reading.file}: ${reading.encoding}, delimiter ${JSON.stringify(reading.delimiter)}, ` +
          `decimal ${JSON.stringify(reading.decimal)}, header on line ${reading.headerLine}, ` +
          `${reading.rows} rows kept${met === '' ? '' : `, met: ${met}`}, ${Math.round(elapsedMs)} ms`,
      );
    }
  }

  refused(code: string): void {
    this.channel.info(`no numbers: ${code}`);
  }

  workerEnded(reason: string): void {
    this.channel.info(`worker ended: ${reason}`);
  }

  show(): void {
    this.channel.show();
  }

  failed(what: string, message: string): void {
    this.channel.error(`${what}: ${message}`);
  }
}
