const SIGNALS = ['SIGINT', 'SIGTERM', 'SIGHUP'] as const;

/** Something unfinished that must not stay behind. */
interface Unfinished {
  discard(): void;
}

const unfinished = new Set<Unfinished>();

/** Has unfinished files removed when the program is interrupted or ends before its time. */
export function removeOnInterruption(files: Unfinished): void {
  if (unfinished.size === 0) {
    process.on('exit', removeAll);
    for (const signal of SIGNALS) process.once(signal, () => endBy(signal));
  }
  unfinished.add(files);
}

function removeAll(): void {
  for (const files of unfinished) files.discard();
}

/** Ends as the signal would have ended the program, so that the caller sees an interruption and no result. */
function endBy(signal: NodeJS.Signals): void {
  removeAll();
  process.kill(process.pid, signal);
}
