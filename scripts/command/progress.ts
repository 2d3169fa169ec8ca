/** Tells how far the computation is: one line that is rewritten on a terminal, one line per message elsewhere. */
export interface Progress {
  step(text: string): void;
  /** Clears the rewritten line. */
  done(): void;
}

/** ESC [2K clears the line, so that a shorter message leaves no rest of a longer one. */
const CLEAR_LINE = '\r\u001b[2K';

export function openProgress(stream: NodeJS.WriteStream = process.stdout): Progress {
  if (!stream.isTTY) return { step: (text) => stream.write(`${text}\n`), done: () => undefined };
  return {
    step: (text) => stream.write(`${CLEAR_LINE}${text.slice(0, stream.columns - 1)}`),
    done: () => stream.write(CLEAR_LINE),
  };
}
