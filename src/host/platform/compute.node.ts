import { parentPort } from 'node:worker_threads';
import { serve } from '../../worker/serve';
import { createHasher } from './hasher.node';
import { openFile } from './readBytes.node';

const port = parentPort;
if (port === null) throw new Error('compute.js runs as a worker thread only');
serve(
  { post: message => port.postMessage(message), listen: listener => port.on('message', listener) },
  { open: openFile, createHasher },
);
