/** A sound recipe of one step, with lines of that step added; they start in line 8. */
export function recipeWith(...lines: readonly string[]): string {
  return [...HEAD, ...lines.map((line) => `    ${line}`), ''].join('\n');
}

const HEAD = [
  'regimen: recipe 1',
  'name: trial',
  'chamber: curlew',
  'steps:',
  '  - name: fill',
  '    process: settle',
  '    time: 12 s',
];

/** A sound chamber, with lines added; they start in line 5. */
export function chamberWith(...lines: readonly string[]): string {
  return [...CHAMBER, ...lines, ''].join('\n');
}

const CHAMBER = [
  'regimen: chamber 1',
  'name: curlew',
  'body: { diameter: 400 mm, height: 120 mm, flow: mixed }',
  'gas_lines: { Ar: { full_scale: 100 sccm, accuracy: 1 % of full scale } }',
];
