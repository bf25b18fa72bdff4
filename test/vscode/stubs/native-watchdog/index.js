// Stands in for VS Code's native watchdog, which ends the extension host when its parent is gone.
const PARENT_GONE = 87;

exports.start = (pid) => {
  const look = () => {
    try {
      process.kill(pid, 0);
    } catch {
      process.exit(PARENT_GONE);
    }
  };
  setInterval(look, 3000).unref();
};

exports.exit = (code) => process.exit(code);
