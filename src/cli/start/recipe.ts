/** The recipe of `start`. */
export const STARTER_RECIPE = `# A recipe: steps in order, each with the process that it intends.
regimen: recipe 1
name: titanium-seed
title: Titanium seed layer
revision: '1'
chamber: ruff
qualified_on: '1'
wafer: { diameter: 200 mm, thickness: 725 um }

# Holds for every step unless the step says otherwise.
throughout:
  temperatures: { wall: 40 degC, wafer: 60 degC }

steps:
  - name: load
    process: load
    time: 20 s
    throttle: open
    flows: {}
  - name: settle
    process: settle # gas and pressure have settled before the plasma is struck
    time: 10 s
    pressure: 3 mTorr
    flows: { Ar: 40 sccm }
  - name: deposit
    process: sputter # sputtered atoms keep part of their energy
    time: 45 s
    pressure: 3 mTorr
    flows: { Ar: 40 sccm }
    power: { magnetron: 4 kW }
    targets: { ti: { voltage: 430 V } }
    surface: { grows: Ti, rate: 60 nm/min +/- 5 % }
  - name: gas-off
    process: unassessed # nothing is judged; the reason is printed
    reason: the chamber only pumps down
    time: 5 s
    throttle: open
    flows: {}
`;
