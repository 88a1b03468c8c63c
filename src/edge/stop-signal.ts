/**
 * A signal that is aborted at the first SIGTERM or SIGINT. After it the process has the defaults of the system
 * again, so that a second one ends it at once.
 */
export function stopSignal(): AbortSignal {
  const controller = new AbortController();
  const stop = (): void => {
    process.off('SIGTERM', stop);
    process.off('SIGINT', stop);
    controller.abort();
  };
  process.on('SIGTERM', stop);
  process.on('SIGINT', stop);
  return controller.signal;
}
