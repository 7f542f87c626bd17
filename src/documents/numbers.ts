import { quoted } from '../units/unit-fault.ts';

/**
 * What is wrong with a number as it is written, undefined where it reads as what it is: a decimal number, finite, within
 * what a number keeps. YAML makes numbers of more than that, and other programs make others of the same text.
 */
export function numberFault(
  written: string,
  value: number,
): { readonly found: string; readonly right: string } | undefined {
  if (!DECIMAL.test(written)) return unusual(written, value);
  if (!Number.isFinite(value)) {
    return { found: `${quoted(written)} is too large for a number`, right: 'write a number below 1e308' };
  }
  if (Number.isSafeInteger(value) || !/^[-+]?[0-9]+$/.test(written)) return undefined;
  return {
    found: `${quoted(written)} has more digits than a number keeps`,
    right: 'write it with a power of ten, or in quotes where it is a name',
  };
}

const DECIMAL = /^[-+]?(?:(?:0|[1-9][0-9]*)(?:\.[0-9]*)?|\.[0-9]+)(?:[eE][-+]?[0-9]+)?$/;

function unusual(written: string, value: number): { readonly found: string; readonly right: string } {
  if (!Number.isFinite(value)) {
    return {
      found: `${quoted(written)} is no measurable number`,
      right: 'write a finite number, or leave the key out',
    };
  }
  const kind = /^[-+]?0[xo]/.test(written) ? 'is not a decimal number' : 'starts with a zero and is read in two ways';
  return { found: `${quoted(written)} ${kind}`, right: `write ${value}, or quotes around it where it is text` };
}
