import { join } from 'node:path';
import { Worker } from 'node:worker_threads';
import type { Uri } from 'vscode';
import type { RunningWorker } from '../compute/runningWorker';

/** Starts dist/compute.js in a thread of its own. */
export function startWorker(extensionUri: Uri): RunningWorker {
  const worker = new Worker(join(extensionUri.fsPath, 'dist', 'compute.js'), {
    stdout: false,
    stderr: false,
  });
  let fault = '';
  worker.on('error', error => (fault = error instanceof Error ? error.message : String(error)));
  return {
    post: message => worker.postMessage(message),
    listen: listener => worker.on('message', listener),
    onEnd: listener => worker.once('exit', code => listener(fault === '' ? `exit code ${code}` : fault)),
    end: () => void worker.terminate(),
  };
}
