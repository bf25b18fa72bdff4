// Lets the workbench run a folder as a web extension under development.
import fs from 'node:fs';
import path from 'node:path';

const BASE = '/development-extension';

/**
 * A web extension must come by http: (from vscode-remote: VS Code refuses to start its Web Workers), and the workbench
 * learns of one under development from the configuration in its page, not from the address. So Playwright serves
 * the folder under the page's own origin, which the page's content security policy allows, and the locations are
 * written into the page after it is parsed and before the workbench's (deferred) script runs.
 */
export async function serveWebExtension({ page, origin }, extensionFolder, suite) {
  await page.context().route(`${origin}${BASE}/**`, (route) => {
    const file = path.join(
      extensionFolder,
      decodeURIComponent(new URL(route.request().url()).pathname.slice(BASE.length)),
    );
    return fs.existsSync(file) ? route.fulfill({ path: file }) : route.fulfill({ status: 404 });
  });
  const { host } = new URL(origin);
  const located = (file) => ({ scheme: 'http', authority: host, path: file });
  await page.addInitScript(writeDevelopmentOptions, {
    extensions: [located(BASE)],
    extensionTestsPath: located(`${BASE}/${path.relative(extensionFolder, suite)}`),
  });
}

/** Runs in the page. */
function writeDevelopmentOptions(options) {
  const write = () => {
    const meta = document.getElementById('vscode-workbench-web-configuration');
    if (!meta) return;
    const configuration = JSON.parse(meta.dataset.settings);
    configuration.developmentOptions = { ...configuration.developmentOptions, ...options };
    meta.dataset.settings = JSON.stringify(configuration);
  };
  document.addEventListener('readystatechange', write, { once: true });
}
