import { formatOf } from './formats.ts';
import { fileStyle, outputStyle } from './style.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Options } from './call.ts';
import type { Out, OutFile, Sink } from './out.ts';
import type { Style } from './style.ts';

/** Where results go and how they are drawn there: standard output first, then the files asked for. */
export interface Outputs {
  readonly each: readonly { readonly sink: Sink; readonly style: Style }[];
  /** Files that could not be begun. */
  readonly faults: readonly Fault[];
  /** Whether nothing is left to write to. */
  isIdle(): boolean;
  /** Gives all files their names, or none where `whole` is false; what went wrong with them. */
  finish(whole: boolean): readonly Fault[];
}

export function openOutputs(
  out: Out,
  { format, out: paths, color }: Pick<Options, 'format' | 'out' | 'color'>,
): Outputs {
  const files: { readonly sink: OutFile; readonly style: Style }[] = [];
  const faults: Fault[] = [];
  for (const path of paths) {
    const opened = out.openFile(path);
    faults.push(...opened.faults);
    if (opened.value !== undefined) files.push({ sink: opened.value, style: fileStyle(formatOf(path) ?? 'text') });
  }
  const abandon = (): void => {
    for (const { sink } of files) sink.abandon();
  };
  const release = files.length === 0 ? () => undefined : onInterrupt(abandon);
  return {
    each: [{ sink: out, style: outputStyle(format, color, out.terminal, process.env) }, ...files],
    faults,
    isIdle: () => out.closed && files.length === 0,
    finish(whole) {
      release();
      if (whole) return files.flatMap(({ sink }) => sink.finish() ?? []);
      abandon();
      return [];
    },
  };
}

/** Clears up before an interrupt ends the process as it would have; the function returned takes that back. */
function onInterrupt(clear: () => void): () => void {
  const signals = ['SIGINT', 'SIGTERM', 'SIGHUP'] as const;
  const handlers = signals.map((signal) => {
    const handler = (): void => {
      clear();
      release();
      process.kill(process.pid, signal);
    };
    process.on(signal, handler);
    return () => process.off(signal, handler);
  });
  const release = (): void => {
    for (const off of handlers) off();
  };
  return release;
}
