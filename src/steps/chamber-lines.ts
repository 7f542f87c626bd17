import type { Chamber } from '../documents/generated/types.ts';
import type { Pointer } from '../documents/document.ts';
import type { Fixed, Unknown } from '../documents/setpoint.ts';
import { vapourPressure } from '../physics/vapour.ts';
import type { FlowReference } from '../units/flow-reference.ts';
import { STATED } from './accuracies.ts';
import { flowReference, type ChamberDraft } from './chamber-draft.ts';
import { fixedOf } from './facts.ts';
import { flowScale, type Delivery, type FlowLine, type Uncertain } from './flow-line.ts';
import { checkGas } from './names.ts';
import { putShares } from './shares.ts';
import type { Line } from './step.ts';

type GasLine = NonNullable<Chamber['gas_lines']>[string];

/** The gas lines of a chamber by name; what only the chamber knows of them goes into its layer. */
export function chamberLines(draft: ChamberDraft): ReadonlyMap<string, FlowLine> {
  const lines = new Map<string, FlowLine>();
  const reference = flowReference(draft.content);
  for (const [name, line] of Object.entries(draft.content.gas_lines ?? {})) {
    lines.set(name, chamberLine(name, line, reference, draft));
  }
  return lines;
}

function chamberLine(name: string, line: GasLine, reference: FlowReference, draft: ChamberDraft): FlowLine {
  const address = `chamber.gas_lines.${name}`;
  const brings = bringsOf(name, line, draft);
  const vapour = line.bubbles === undefined ? 0 : bubbledShare(name, line.bubbles, draft);
  const draws = line.draws !== undefined;
  if (vapour === undefined) return { line: { name, brings }, address: `flows.${name}`, draws };
  const fullScale = fixedOf(line.full_scale);
  const plain = { ...PERFECT, reference };
  const delivery: Delivery = {
    ...plain,
    ...deliveryOf(line, plain),
    vapour,
    accuracy: line.accuracy?.tolerance ?? draft.accuracies.bySite.get('flow'),
    fullScale: fullScale === undefined ? 0 : flowScale(plain).value(fullScale.measure),
  };
  const scale = flowScale(delivery);
  // What the line delivers at full scale, so that a flow over it is how far the controller is open.
  if (fullScale !== undefined) draft.layer.put(`${address}.full_scale`, fullScale, { ...scale, uncertainty: () => 0 });
  if (line.response !== undefined) draft.layer.put(`${address}.response`, line.response, STATED);
  return { line: { name, brings }, address: `flows.${name}`, scale, draws };
}

const PERFECT: Omit<Delivery, 'reference'> = {
  gain: { value: 1, uncertainty: 0 },
  offset: { value: 0, uncertainty: 0 },
  vapour: 0,
  accuracy: undefined,
  fullScale: 0,
};

function deliveryOf({ delivers }: GasLine, plain: Delivery): Partial<Delivery> {
  const gain = fixedOf(delivers?.gain);
  const offset = fixedOf(delivers?.offset);
  return {
    ...(gain === undefined ? {} : { gain: uncertain(gain) }),
    ...(offset === undefined ? {} : { offset: scaled(offset, plain) }),
  };
}

function uncertain({ measure }: Fixed): Uncertain {
  return { value: measure.value, uncertainty: STATED.uncertainty(measure) };
}

function scaled({ measure }: Fixed, plain: Delivery): Uncertain {
  const scale = flowScale(plain);
  // The scale of a line knows no flow below zero, an offset does.
  const size = scale.value({ ...measure, value: Math.abs(measure.value) });
  return { value: Math.sign(measure.value) * size, uncertainty: scale.uncertainty(measure) };
}

function bringsOf(name: string, { brings, draws, bubbles }: GasLine, draft: ChamberDraft): Line['brings'] {
  const { document, faults } = draft;
  const known = (gas: string, pointer: Pointer, part?: 'key'): void => {
    checkGas(gas, () => document.place(['gas_lines', name, ...pointer], part), draft);
  };
  if (bubbles !== undefined) {
    known(bubbles.gas, ['bubbles', 'gas']);
    known(bubbles.carrier, ['bubbles', 'carrier']);
    return [bubbles.gas, bubbles.carrier].map((gas) => ({ gas, share: shareAddress(name, gas) }));
  }
  if (draws !== undefined) {
    known(draws.gas, ['draws', 'gas']);
    return [{ gas: draws.gas }];
  }
  if (typeof brings === 'object') {
    for (const gas of Object.keys(brings)) known(gas, ['brings', gas], 'key');
    faults.push(...putShares(draft.layer, `chamber.gas_lines.${name}.brings`, brings));
    return Object.keys(brings).map((gas) => ({ gas, share: shareAddress(name, gas) }));
  }
  const gas = brings ?? name;
  if (brings === undefined) known(gas, [], 'key');
  else known(gas, ['brings']);
  return [{ gas }];
}

function shareAddress(line: string, gas: string): string {
  return `chamber.gas_lines.${line}.brings.${gas}`;
}

type Bubbles = NonNullable<GasLine['bubbles']>;

/** Share of vapour in what leaves a bubbler, the carrier saturated: vapour pressure over the pressure in the vessel. */
function bubbledShare(name: string, bubbles: Bubbles, draft: ChamberDraft): number | undefined {
  const temperature = known(bubbles.temperature, draft);
  const pressure = known(bubbles.pressure, draft);
  const antoine = ['a', 'b', 'c'].map(
    (key) => draft.library.datum(`gases.${bubbles.gas}.vapour_pressure.${key}`)?.value,
  );
  const [a, b, c] = antoine;
  if (temperature === undefined || pressure === undefined || a === undefined || b === undefined || c === undefined)
    return undefined;
  const share = vapourPressure(temperature.value, a, b, c) / pressure.value;
  const place = draft.document.place(['gas_lines', name, 'bubbles']);
  if (!(share < 1)) {
    draft.faults.push({
      place,
      found: `${bubbles.gas} boils in its vessel`,
      right: 'a vapour pressure below the pressure in the vessel',
    });
    return undefined;
  }
  const steepness = (Math.LN10 * b) / (temperature.value + c) ** 2;
  const uncertainty = share * Math.hypot(steepness * temperature.uncertainty, pressure.uncertainty / pressure.value);
  const shared = { uncertainty, dimension: 'fraction', unit: '%', origin: { place } } as const;
  draft.layer.give({ ...shared, address: shareAddress(name, bubbles.gas), value: share });
  draft.layer.give({ ...shared, address: shareAddress(name, bubbles.carrier), value: 1 - share });
  return share;
}

function known(value: Fixed | Unknown | undefined, { plain }: ChamberDraft): Uncertain | undefined {
  const fixed = fixedOf(value);
  return fixed === undefined
    ? undefined
    : { value: fixed.measure.value, uncertainty: plain.uncertainty(fixed.measure) };
}
