// A folder for one run, gone afterwards however the run ends.
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';

export function makeScratch() {
  const folder = fs.realpathSync(fs.mkdtempSync(path.join(os.tmpdir(), 'tenuity-editor-')));
  const remove = () => {
    process.off('exit', remove);
    fs.rmSync(folder, { recursive: true, force: true, maxRetries: 5, retryDelay: 100 });
  };
  process.once('exit', remove);
  return { folder, remove };
}
