import { read } from '../compare/readsDisk';
export const readAll = read;
