/** The commands that the manifest contributes. */
export const commands = {
  newFile: 'tenuity.newFile',
  toggleHints: 'tenuity.toggleHints',
  restartServer: 'tenuity.restartServer',
  showLog: 'tenuity.showLog',
} as const;
