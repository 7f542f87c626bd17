import { STATED } from './accuracies.ts';
import { referredScale, type ChamberDraft } from './chamber-draft.ts';
import { checkGas } from './names.ts';
import { putShares } from './shares.ts';
import type { Setup } from './step.ts';
import { isSetpoint } from './written.ts';

export type PumpFacts = Pick<Setup, 'pumpSpeed' | 'pumpRows' | 'residual'>;

/** What a chamber's pump is made of; its values go to `chamber.pump`. */
export function chamberPump(draft: ChamberDraft): PumpFacts {
  const { pump } = draft.content;
  if (pump === undefined) return { pumpSpeed: 'none', pumpRows: 0, residual: [] };
  const { residual, reference, speed, ...plain } = pump;
  draft.layer.putAll('chamber.pump', { ...plain, ...(speed === undefined ? {} : { speed }) }, STATED);
  // The pump's gas is as warm as any other that the site says nothing of.
  if (pump.temperature !== undefined) draft.layer.put('chamber.pump.temperature', pump.temperature, draft.plain);
  if (reference !== undefined) {
    draft.layer.putAll('chamber.pump.reference.flows', reference.flows, referredScale(draft.content));
    draft.layer.put('chamber.pump.reference.pressure', reference.pressure, STATED);
  }
  return { ...speedFacts(speed, draft), residual: residualGases(residual, draft) };
}

type Pump = NonNullable<ChamberDraft['content']['pump']>;

function speedFacts(speed: Pump['speed'], draft: ChamberDraft): Pick<PumpFacts, 'pumpSpeed' | 'pumpRows'> {
  if (speed === undefined) return { pumpSpeed: 'none', pumpRows: 0 };
  if (isSetpoint(speed)) return { pumpSpeed: 'one', pumpRows: 0 };
  if (Array.isArray(speed)) return { pumpSpeed: 'by-pressure', pumpRows: speed.length };
  for (const gas of Object.keys(speed)) checkGas(gas, () => draft.document.place(['pump', 'speed', gas], 'key'), draft);
  return { pumpSpeed: 'by-gas', pumpRows: 0 };
}

function residualGases(residual: Pump['residual'], draft: ChamberDraft): readonly string[] {
  if (residual === undefined) return [];
  const gases = Object.keys(residual);
  for (const gas of gases) checkGas(gas, () => draft.document.place(['pump', 'residual', gas], 'key'), draft);
  draft.faults.push(...putShares(draft.layer, 'chamber.pump.residual', residual));
  return gases;
}
