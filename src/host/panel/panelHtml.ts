import { env, l10n, Uri, type Webview } from 'vscode';

/** The page of a panel: a root, our style, our script, and nothing else may load or run. The content comes by message. */
export function panelHtml(webview: Webview, extensionUri: Uri): string {
  const nonce = makeNonce();
  const address = (...path: string[]): string =>
    escaped(webview.asWebviewUri(Uri.joinPath(extensionUri, ...path)).toString());
  const policy = [
    "default-src 'none'",
    `script-src 'nonce-${nonce}'`,
    `style-src ${webview.cspSource}`,
    `img-src ${webview.cspSource} data:`,
    `font-src ${webview.cspSource}`,
  ].join('; ');
  return `<!DOCTYPE html>
<html lang="${escaped(l10n.bundle === undefined ? 'en' : env.language)}">
<head>
<meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="${escaped(policy)}">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escaped(l10n.t('Comparison'))}</title>
<link rel="stylesheet" href="${address('media', 'panel.css')}">
<link rel="stylesheet" href="${address('media', 'page.css')}">
</head>
<body>
<main id="root"></main>
<script nonce="${nonce}" src="${address('dist', 'webview.js')}"></script>
</body>
</html>`;
}

/** 128 random bits: a script without this mark does not run. */
function makeNonce(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  return Array.from(bytes, byte => byte.toString(16).padStart(2, '0')).join('');
}

const escaped = (text: string): string => text.replace(/[&<>"']/g, symbol => `&#${symbol.charCodeAt(0)};`);
