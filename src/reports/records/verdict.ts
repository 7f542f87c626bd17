import type { StepRun } from '../../quantities/run.ts';
import { DIMENSIONS } from '../../units/dimensions.ts';
import type { Assumed, Verdict } from '../../verdicts/verdict.ts';
import { verdictDimension, verdictMessage } from '../sentences.ts';
import type { Shown } from '../shown.ts';
import { referenceRecord } from './quantity.ts';

/** A verdict in SI. Keys that have nothing to say are left out. */
export function verdictRecord(verdict: Verdict, run: StepRun, shown: Shown) {
  const {
    assumption,
    process,
    reference,
    over,
    subject,
    kind,
    level,
    perhaps,
    value,
    uncertainty,
    bound,
    margin,
    place,
    waived,
  } = verdict;
  return {
    assumption,
    process,
    quantity: referenceRecord(reference),
    ...(over === undefined ? {} : { over: referenceRecord(over) }),
    ...(subject === undefined ? {} : { subject }),
    kind,
    level,
    ...(perhaps === undefined ? {} : { perhaps }),
    ...(value === undefined ? {} : { value, unit: DIMENSIONS[verdictDimension(verdict)].si }),
    ...(uncertainty === undefined ? {} : { uncertainty }),
    bound,
    ...(margin === undefined ? {} : { margin }),
    ...absence(verdict),
    ...grounds(verdict, run, shown),
    file: place.file,
    line: place.line,
    column: place.column,
    message: verdictMessage(verdict, run, shown),
    ...(waived === undefined ? {} : { waived }),
  };
}

function absence({ needs, because, instance }: Verdict) {
  const time = instance?.kind === 'ramp' ? instance.time : undefined;
  return {
    ...(time === undefined ? {} : { time }),
    ...(needs === undefined ? {} : { missing: needs }),
    ...(because === undefined ? {} : { because }),
  };
}

function grounds({ remarks, assumed }: Verdict, run: StepRun, shown: Shown) {
  return {
    ...(remarks.length === 0 ? {} : { remarks }),
    ...(assumed.length === 0 ? {} : { assumed: assumed.map((one) => assumedRecord(one, run, shown)) }),
  };
}

function assumedRecord({ address, value, uncertainty, because }: Assumed, run: StepRun, { coverage }: Shown) {
  return {
    address,
    value,
    unit: DIMENSIONS[run.given(address)?.dimension ?? 'number'].si,
    uncertainty: coverage * uncertainty,
    because,
  };
}
