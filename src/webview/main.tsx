import { render } from 'preact';
import { readPanelState } from '../protocol/panelState';
import type { FromPanel } from '../protocol/fromPanel';
import { readToPanel, type Busy, type Show } from '../protocol/toPanel';
import { keepPlace, returnToPlace } from './place';
import { Page } from './page';

/** What the editor gives a page inside a panel. */
interface PanelHost {
  postMessage(message: FromPanel): void;
  getState(): unknown;
  setState(state: unknown): void;
}
declare function acquireVsCodeApi(): PanelHost;

const host = acquireVsCodeApi();
const root = document.getElementById('root');
if (root === null) throw new Error('the page has no root');

let show: Show | null = null;
let busy: Busy | null = null;

function draw(): void {
  if (root === null) return;
  render(<Page show={show} busy={busy} send={message => host.postMessage(message)} />, root);
}

window.addEventListener('message', (event: MessageEvent<unknown>) => {
  const message = readToPanel(event.data);
  if (message.type === 'busy') {
    busy = message;
    draw();
    return;
  }
  if (show !== null && message.revision < show.revision) return; // a later answer is already on the page
  const first = show === null;
  show = message;
  if (busy !== null && busy.revision <= message.revision) busy = null;
  draw();
  if (first) returnToPlace(readPanelState(host.getState()));
  keepPlace(message.recipe, state => host.setState(state));
});
const keep = (): void => {
  if (show !== null) keepPlace(show.recipe, state => host.setState(state));
};
window.addEventListener('scroll', keep, { passive: true });
root.addEventListener('toggle', keep, { capture: true }); // toggle does not bubble

draw();
host.postMessage({ type: 'ready' });
