/** The site document of `start`. */
export const STARTER_SITE = `# The site: what holds for every recipe in this folder and below.
regimen: site 1
name: saltings
title: Saltings bench line

# Where its documents are, relative to this file.
chambers: [chambers/*.yaml]
recipes: [recipes/**]
# substances: [substances/*.yaml]      # gases and films of your own
# processes: [processes/*.yaml]        # intended processes of your own, or other bounds for the built-in ones

# Units in which numbers are shown that no recipe wrote.
show:
  pressure: mTorr
  length: mm
  temperature: degC
  flow: sccm

# How far off a setpoint may be where neither its own text nor a gauge or gas line says so.
tolerances:
  time: 0.1 s
  temperature: 5 K
  pressure: 1 % of reading
`;
