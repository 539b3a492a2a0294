import { serve } from '../../worker/serve';
import { createHasher } from './hasher.web';
import { openFile } from './readBytes.web';

declare function postMessage(message: unknown): void;
declare let onmessage: (event: { readonly data: unknown }) => void;

serve(
  { post: message => postMessage(message), listen: listener => (onmessage = event => listener(event.data)) },
  { open: openFile, createHasher },
);
