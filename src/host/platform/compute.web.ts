import { serve } from '../../worker/serve';
import { createHasher } from './hasher.web';
import { openFile } from './readBytes.web';

declare function postMessage(message: unknown): void;
declare const self: { onmessage: ((event: { readonly data: unknown }) => void) | null };

serve(
  {
    post: message => postMessage(message),
    listen: listener => (self.onmessage = event => listener(event.data)),
  },
  { open: openFile, createHasher },
);
