import path from 'node:path';

/** The folder of the project. */
export const root = path.resolve(import.meta.dirname, '..', '..');
