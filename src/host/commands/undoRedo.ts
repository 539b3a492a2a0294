import type { Host } from '../host';
import type { Command } from './command';

/** Takes back the last change of the comparison in front. */
export const undo = (host: Host): Command => ({
  id: 'weighbeam.undo',
  execute: async () => host.panels.current?.act({ kind: 'undo' }),
});

/** Makes the change again that was taken back last. */
export const redo = (host: Host): Command => ({
  id: 'weighbeam.redo',
  execute: async () => host.panels.current?.act({ kind: 'redo' }),
});
