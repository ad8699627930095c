// Loaded into a child before its own program: when the parent is gone, the child ends as if it had been told to.
const LAST_MOMENT_MS = 5_000;

process.once('disconnect', () => {
  setTimeout(() => process.kill(process.pid, 'SIGKILL'), LAST_MOMENT_MS).unref();
  process.kill(process.pid, 'SIGTERM');
});
