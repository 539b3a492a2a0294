import { paint } from '../webview/paints';
export const show = paint;
