// Packs the extension as `npm run package` does, without the network.
import { createVSIX } from '@vscode/vsce';

export async function packageExtension(folder, packagePath) {
  // The pictures of the README lie beside it; there is no public address to point them to.
  await createVSIX({ cwd: folder, packagePath, dependencies: false, rewriteRelativeLinks: false });
}
