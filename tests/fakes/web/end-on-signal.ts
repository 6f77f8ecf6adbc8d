/**
 * Ctrl-C or a stop from the parent closes tidily. A signal to the process group often comes twice (a wrapper passes it
 * on), so repeats are ignored; what is not closed within three seconds is left.
 */
export function endOnSignal(close: () => Promise<void>): void {
  let closing = false;
  const end = () => {
    if (closing) return;
    closing = true;
    setTimeout(() => process.exit(1), 3000).unref();
    close().then(
      () => process.exit(0),
      (error) => {
        console.error(error);
        process.exit(1);
      },
    );
  };
  process.on('SIGINT', end);
  process.on('SIGTERM', end);
}
