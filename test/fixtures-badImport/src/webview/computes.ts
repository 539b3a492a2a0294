import { readAll } from '../readers/reachesUp';
export const compute = readAll;
