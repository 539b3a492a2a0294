import { Uri } from 'vscode';
import type { RunningWorker } from '../compute/runningWorker';

/** The part of a browser's worker that is used; the host's own types know no DOM. */
interface BrowserWorker {
  postMessage(message: unknown): void;
  terminate(): void;
  onmessage: ((event: { readonly data: unknown }) => void) | null;
  onerror: ((event: { readonly message?: string }) => void) | null;
}
declare const Worker: new (address: string, options: { readonly name: string }) => BrowserWorker;

/** Starts dist/browser/compute.js in a web worker. */
export function startWorker(extensionUri: Uri): RunningWorker {
  const worker = new Worker(Uri.joinPath(extensionUri, 'dist', 'browser', 'compute.js').toString(true), {
    name: 'weighbeam',
  });
  let ended: ((reason: string) => void) | null = null;
  return {
    post: message => worker.postMessage(message),
    listen: listener => (worker.onmessage = event => listener(event.data)),
    onEnd: listener => {
      ended = listener;
      worker.onerror = event => {
        worker.terminate();
        ended?.(event.message ?? 'error');
        ended = null;
      };
    },
    end: () => {
      worker.terminate();
      ended?.('ended');
      ended = null;
    },
  };
}
