import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/* A site with many recipes, made up for measuring: all differ in their setpoints, as the recipes of one line do. */

const SITE = `regimen: site 1
name: bench
chambers: [chambers/*.yaml]
recipes: [recipes/**]
`;

const CHAMBER = `regimen: chamber 1
name: avocet
body: { diameter: 460 mm, height: 300 mm, flow: mixed }
lengths: { gap: 30 mm }
generators: { source: { frequency: 13.56 MHz, full_scale: 3 kW } }
pump: { speed: 1100 L/s, lowest_speed: 20 L/s, base_pressure: 2e-7 Torr, leak_up_rate: 0.2 mTorr/min, temperature: 40 degC }
gauges: { process: { full_scale: 10 Torr, accuracy: 0.25 % of reading, usable_from: 0.01 % } }
gas_lines:
  Ar: { full_scale: 500 sccm, accuracy: 1 % of full scale }
  N2: { full_scale: 500 sccm, accuracy: 1 % of full scale }
  O2: { full_scale: 200 sccm, accuracy: 1 % of full scale }
  SiH4: { full_scale: 200 sccm, accuracy: 1 % of full scale }
temperatures: { wall: 60 degC }
targets: { ti: { material: Ti, throw: 90 mm, generator: source } }
`;

/** Text of one recipe of twelve steps; its number sets its setpoints. */
export function recipeText(number: number): string {
  const pressure = (base: number) => (base * (1 + (number % 97) / 200)).toFixed(3);
  const flow = (base: number) => String(base + (number % 41));
  const steps = Array.from({ length: 12 }, (_, step) => stepText(step, pressure, flow));
  return `regimen: recipe 1
name: bench-${number}
title: Recipe ${number} of a fleet made for measuring
revision: '${(number % 9) + 1}'
chamber: avocet
wafer: { diameter: 200 mm, thickness: 725 um, count: 1 }
throughout:
  temperatures: { wall: 60 degC, wafer: 120 degC }
steps:
${steps.join('')}`;
}

function stepText(step: number, pressure: (base: number) => string, flow: (base: number) => string): string {
  const name = `${['settle', 'strike', 'deposit', 'purge'][step % 4] ?? 'step'}-${step}`;
  const head = `  - name: ${name}\n`;
  switch (step % 4) {
    case 0:
      return `${head}    process: settle
    time: 12 s
    pressure: ${pressure(5 + step / 8)} mTorr
    flows:
      Ar: ${flow(120)} sccm
      N2: ${flow(60)} sccm
`;
    case 1:
      return `${head}    process: soak
    time: 3 s
    pressure: ${pressure(5 + step / 8)} mTorr
    flows: { Ar: ${flow(120)} sccm, N2: ${flow(60)} sccm }
    power: { source: 400 W }
`;
    case 2:
      return `${head}    process: sputter
    time: { usually: 85 s, at_least: 70 s, at_most: 100 s }
    pressure: ${pressure(5 + step / 8)} mTorr
    flows: { Ar: ${flow(120)} sccm, N2: ${flow(60)} sccm }
    power:
      source: 2.4 kW
    targets: { ti: { voltage: 410 V } }
    surface:
      grows: TiN
      rate: 90 nm/min
`;
    default:
      return `${head}    process: purge
    time: 20 s
    pressure: 50 mTorr +/- 2 %
    flows:
      N2: ${flow(300)} sccm
`;
  }
}

/** Writes a site with so many recipes and returns their texts. */
export function writeFleet(folder: string, count: number): readonly string[] {
  mkdirSync(join(folder, 'chambers'), { recursive: true });
  mkdirSync(join(folder, 'recipes'), { recursive: true });
  writeFileSync(join(folder, 'regimen.yaml'), SITE);
  writeFileSync(join(folder, 'chambers', 'avocet.yaml'), CHAMBER);
  return Array.from({ length: count }, (_, number) => {
    const text = recipeText(number);
    writeFileSync(join(folder, 'recipes', `recipe-${String(number).padStart(6, '0')}.yaml`), text);
    return text;
  });
}
