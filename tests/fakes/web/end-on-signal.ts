/** Ctrl-C or a stop from the parent closes tidily once; a second signal ends at once. */
export function endOnSignal(close: () => Promise<void>): void {
  let closing = false;
  const end = () => {
    if (closing) process.exit(1);
    closing = true;
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
