import { chunk } from 'lodash';
export const pieces = chunk;
