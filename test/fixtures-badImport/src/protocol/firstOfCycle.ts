import { second } from './secondOfCycle';
export const first = (): string => second();
