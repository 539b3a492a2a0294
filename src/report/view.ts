export type { ViewContext } from './view/context';
export type { View } from './view/shown';
