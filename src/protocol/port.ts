/** One end of a message channel, the same for a worker thread, a web worker, a web page and a pair made by a test. */
export interface Port {
  post(message: unknown): void;
  listen(listener: (message: unknown) => void): void;
}
