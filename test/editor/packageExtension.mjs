// Packs the extension as `npm run package` does, without the network.
import { createVSIX } from '@vscode/vsce';

export async function packageExtension(folder, packagePath) {
  await createVSIX({ cwd: folder, packagePath, dependencies: false });
}
