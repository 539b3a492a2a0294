import { readFileSync } from 'node:fs';
export const read = (file: string) => readFileSync(file);
