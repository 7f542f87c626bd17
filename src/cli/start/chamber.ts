/** The chamber of `start`. */
export const STARTER_CHAMBER = `# A chamber: what a recipe runs on. Every number here is an example to be replaced by that of your own chamber.
regimen: chamber 1
name: ruff
title: Magnetron sputter chamber, 200 mm
revision: '1'

# The gas volume, and the lengths that Knudsen numbers are taken against.
body: { diameter: 380 mm, height: 220 mm, flow: mixed }
lengths: { gap: 60 mm }

generators:
  magnetron: { full_scale: 10 kW }
targets:
  ti: { material: Ti, throw: 60 mm, generator: magnetron }

# At the chamber's port with the throttle open; the lowest speed is that of the throttle as far shut as it controls.
pump:
  speed: { Ar: 900 L/s, H2O: 2200 L/s, N2: 950 L/s }
  lowest_speed: 60 L/s
  base_pressure: 3e-8 Torr
  leak_up_rate: 0.02 mTorr/min
  residual: { H2O: 85 %, N2: rest }
  temperature: 25 degC

gauges:
  process: { full_scale: 100 mTorr, accuracy: 0.25 % of reading, usable_from: 0.5 % }

# A step's flows name these lines.
gas_lines:
  Ar: { full_scale: 100 sccm, accuracy: 1 % of full scale }

# What the chamber may be set to.
limits:
  pressure: { at_least: 0.5 mTorr, at_most: 50 mTorr }

temperatures: { wall: 40 degC }
`;
