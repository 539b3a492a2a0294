import { first } from './firstOfCycle';
export const second = (): string => first();
