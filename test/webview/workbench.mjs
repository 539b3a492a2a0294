// Drives the editor's workbench as a person with a keyboard does.
import { mkdir } from 'node:fs/promises';
import path from 'node:path';
import { openBrowser } from '../../.config/host/chromium.mjs';
import { startServer, workbenchAddress } from '../../.config/host/server.mjs';
import { root } from '../../.config/command.mjs';

/** A fresh editor with the extension under development and `folder` open. `options` are those of startServer. */
export async function openWorkbench(folder, { extension = root, file, viewport, ...options } = {}) {
  const server = await startServer(options);
  const { browser, context } = await openBrowser(server.origin, { viewport });
  const page = await context.newPage();
  page.setDefaultTimeout(20_000);
  const refusals = [];
  page.on('console', message => {
    if (/Content Security Policy|Refused to/.test(message.text())) refusals.push(message.text());
  });
  const close = async () => {
    await browser.close();
    await server.stop();
  };
  try {
    await page.goto(workbenchAddress(server, { folder, extension, file }));
    await page.waitForFunction('globalThis.driver');
    await page.evaluate('driver.whenWorkbenchRestored()');
  } catch (error) {
    await close();
    throw error;
  }
  return { page, server, refusals, close, ...gestures(page) };
}

function gestures(page) {
  const panel = page.frameLocator('iframe.webview.ready').frameLocator('#active-frame');
  const input = page.locator('.quick-input-widget:visible input');
  const rows = page.locator('.quick-input-widget:visible .monaco-list-row');
  const title = page.locator('.quick-input-widget:visible .quick-input-title');
  return {
    /** Text box of the quick pick that is open. */
    input,
    /** Items of the quick pick that is open. */
    rows,
    /** What stands over the question that is open. */
    title,

    /** Answers the question that is open; done once it is another one, or none. */
    async leaveQuestion(answer = () => page.keyboard.press('Enter')) {
      const same = title.filter({ hasText: await title.innerText() });
      await answer();
      await same.waitFor({ state: 'hidden' });
    },
    /** The page that the extension shows in its panel. */
    panel,

    /** Takes the likely answer of every question, until the panel shows an answer. */
    async answerAll() {
      const answer = panel.getByText(/interval/).first();
      for (let waited = 0; waited < 60 && !(await answer.isVisible()); waited++) {
        if (await input.isVisible()) await page.keyboard.press('Enter');
        await page.waitForTimeout(250);
      }
      await answer.waitFor();
    },

    async openFile(name) {
      await page.keyboard.press('Control+P');
      await input.fill(name);
      await rows.filter({ hasText: name }).first().waitFor();
      await page.keyboard.press('Enter');
      await page.locator('.tab.active', { hasText: name }).waitFor();
    },

    /** Runs a command from the palette, by the title it has there. */
    async run(title) {
      await page.keyboard.press('F1');
      await input.fill(`>${title}`);
      await rows.filter({ hasText: title }).first().waitFor();
      await page.keyboard.press('Enter');
    },

    clipboard: () => page.evaluate('navigator.clipboard.readText()'),

    /** Keeps a picture for whoever looks after the run. */
    async picture(name) {
      const folder = path.join(root, 'test', 'pictures');
      await mkdir(folder, { recursive: true });
      await page.screenshot({ path: path.join(folder, `${name}.png`) });
    },
  };
}
