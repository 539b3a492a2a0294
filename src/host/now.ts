import { offsetTime } from '../settings/offsetTime';

/** This moment, as records write it. */
export const now = (): string => offsetTime(new Date());
