// Made by `npm run generate` from schemas/. Do not edit.
import type { Accuracy, Fixed, Range, Rest, Setpoint, Unknown } from '../setpoint.ts';

/**
 * The steps, in the order in which they run. One that has `steps` of its own is a cycle.
 *
 * @minItems 1
 *
 * Items: A step, or a cycle of steps.
 */
export type Steps = [Cycle | Step, ...(Cycle | Step)[]];
/**
 * Findings that were looked at and accepted. They stay in every report, marked as waived, and block nothing.
 */
export type Waivers = Waiver[];
/**
 * Pumping speed below each pressure, from the lowest pressure up; the last entry may go without `below` and then holds above all others.
 *
 * @minItems 1
 */
export type SpeedByPressure = [SpeedRow, ...SpeedRow[]];

export interface Documents {
  recipe: Recipe;
  chamber: Chamber;
  substances: Substances;
  process: Process;
  site: Site;
}
/**
 * A process recipe: what is set in each step on one chamber, and the process that each step is meant to be.
 */
export interface Recipe {
  /**
   * Says that this is a recipe document, and in which version of the format. It is the first key of the file.
   */
  regimen: 'recipe 1';
  /**
   * Names the recipe in every report, once in a site.
   */
  name: string;
  /**
   * One line that says what it is, printed beside the name.
   */
  title?: string;
  /**
   * Your own revision of this document, in quotes so that 1.10 stays 1.10. It is printed with every result.
   */
  revision?: string;
  /**
   * Free text for whoever reads the document. Nothing is judged by it.
   */
  remark?: string;
  /**
   * The chamber that it runs on: its name, or the relative path of its document, which has a slash or ends in .yaml.
   */
  chamber: string;
  /**
   * Revision of the chamber on which the recipe was qualified. A note is printed when the chamber has another one.
   */
  qualified_on?: string;
  /**
   * What lies in the chamber; `none` where nothing does. Its area feeds utilisation, flow per area and power density.
   */
  wafer?: Substrate | 'none' | 'unknown';
  throughout?: Throughout;
  starts_in?: StartsIn;
  steps: Steps;
  waivers?: Waivers;
}
/**
 * Setpoints that hold in every step below unless the step, or a cycle further in, has its own.
 */
export interface Throughout {
  /**
   * How long the step lasts. Feeds turnovers and exposure; a range is judged at the usual value and at both limits.
   */
  time?: Setpoint;
  /**
   * Total pressure in the chamber that the step holds. Feeds the mean free path, and with it nearly every number of the step.
   */
  pressure?: Setpoint;
  /**
   * Stands in place of a pressure where the valve is set and the pressure follows: open, closed, or how far open. With the throttle open the pressure is what the pump leaves. A position is kept for later: no pressure is computed from it yet.
   */
  throttle?: Setpoint | 'open' | 'closed';
  /**
   * Pressure at which a soak with the valve shut begins. Goes with `throttle: closed`.
   */
  fill_to?: Setpoint;
  flows?: Flows;
  composition?: Shares;
  temperatures?: Temperatures;
  power?: Power;
  duty?: Duty;
  plasma?: Plasma;
  surface?: Surface;
  reactant?: Reactant;
  targets?: TargetsRun;
  melts?: MeltsRun;
  lengths?: Lengths;
  /**
   * Gas behind the wafer; `none` where there is none. Kept for later: nothing is computed from it yet.
   */
  backside?: BacksideGas | 'none' | 'unknown';
  body?: Body;
  /**
   * What lies in the chamber; `none` where nothing does. Its area feeds utilisation, flow per area and power density.
   */
  wafer?: Substrate | 'none' | 'unknown';
  other?: Other;
}
/**
 * Flow through each gas line, by the line's name in the chamber. Feeds mole fractions, residence time and utilisation. `{}` says that nothing flows.
 */
export interface Flows {
  /**
   * What the line's controller lets through, carrier or dilution included. A line that draws vapour may have an amount fed in the step.
   */
  [k: string]: Setpoint;
}
/**
 * Mole fractions by gas or element. One of them may be `rest`.
 */
export interface Shares {
  /**
   * Mole fraction, bare or in percent, or `rest`.
   */
  [k: string]: Fixed | Unknown | Rest;
}
/**
 * Temperatures of what the gas touches. The gas itself follows from them where it is not given.
 */
export interface Temperatures {
  /**
   * Temperature of the chamber's wall, or of a hot-wall tube by zones. Sets the gas temperature, and the pump's where that is not given.
   */
  wall?: Setpoint | Zones;
  /**
   * Temperature of the wafer's face. Feeds the mean free path in features, the gas temperature where that is not given, and the Rayleigh number.
   */
  wafer?: Setpoint;
  /**
   * Temperature of the gas between the walls, where it was measured or modelled. Without it a rule for the process stands in, and is shown as assumed.
   */
  gas?: Setpoint;
  /**
   * Temperature of the surface below the wafer. Kept for later: nothing is computed from it yet.
   */
  chuck?: Setpoint;
}
/**
 * Power of each generator, by its name in the chamber. Feeds power density, and tells that the gas is that of a plasma.
 */
export interface Power {
  /**
   * Forward power of this generator, averaged over its pulses.
   */
  [k: string]: Setpoint;
}
/**
 * Share of the time in which a pulsed generator is on, by its name in the chamber. Kept for later: nothing is computed from it yet.
 */
export interface Duty {
  /**
   * Share of the time in which this generator is on. Kept for later: nothing is computed from it yet.
   */
  [k: string]: Setpoint;
}
/**
 * What is known of the plasma. Kept for later: nothing is computed from it yet.
 */
export interface Plasma {
  /**
   * Self-bias of the wafer's electrode, by its size; a minus sign changes nothing. Kept for later: nothing is computed from it yet.
   */
  bias_voltage?: Setpoint;
  /**
   * Temperature of the bulk electrons. Kept for later: nothing is computed from it yet.
   */
  electron_temperature?: Setpoint;
  /**
   * Electrons in a volume of bulk plasma. Kept for later: nothing is computed from it yet.
   */
  electron_density?: Setpoint;
  /**
   * Thickness of the sheath where it was measured. Kept for later: nothing is computed from it yet.
   */
  sheath?: Setpoint;
  /**
   * The ion that crosses the sheath. Kept for later: nothing is computed from it yet.
   */
  ion?: string;
  /**
   * Ion current over the wafer's area, measured. Kept for later: nothing is computed from it yet.
   */
  ion_current?: Setpoint;
}
/**
 * What happens on the wafer. A measured rate is worth more than a guessed sticking coefficient: flux, utilisation and surface rate follow from it by the element balance.
 */
export interface Surface {
  /**
   * Film that is removed, by its name among the films. Its density gives the flux of atoms.
   */
  etches?: string;
  /**
   * Film that is laid down, by its name among the films. Its density gives the flux of atoms.
   */
  grows?: string;
  /**
   * Measured etch or growth rate on the open surface.
   */
  rate?: Setpoint;
  /**
   * Share of the wafer that is etched or grown on. Without it the whole wafer.
   */
  open_area?: Setpoint;
  /**
   * Volatile product of an etch, from which the element balance counts the etchant's atoms.
   */
  product?: string;
  /**
   * Share of the sites that a dose is meant to fill. Kept for later: nothing is computed from it yet.
   */
  coverage?: Setpoint;
  /**
   * Real surface over the wafer's flat area, for patterned wafers. Kept for later: nothing is computed from it yet.
   */
  enhancement?: Setpoint;
}
/**
 * The gas that does the work at the surface, and what is known of its reaction.
 */
export interface Reactant {
  /**
   * Name of the gas, as a line brings it or as the composition names it.
   */
  gas: string;
  /**
   * Probability that a molecule that hits an open site reacts. Feeds the surface rate and the monolayer time.
   */
  sticking?: Setpoint;
  /**
   * Molecules that a real area takes up until it is full. Feeds the monolayer time; without it 1e19 1/m2.
   */
  site_density?: Setpoint;
}
/**
 * Sputter targets that run in this step, by their names in the chamber. The chamber's only target runs without being named.
 */
export interface TargetsRun {
  [k: string]: TargetRun;
}
/**
 * How this target runs in the step.
 */
export interface TargetRun {
  /**
   * Discharge voltage, by its size. Checks how far the spectrum of the sputtered atoms reaches.
   */
  voltage?: Setpoint;
  /**
   * Energy at which atoms leave the target, where it is known. Without it the middle of Thompson's spectrum.
   */
  energy?: Setpoint;
  /**
   * Distance from the target to the wafer, where this step sets it.
   */
  throw?: Setpoint;
}
/**
 * Evaporation sources that run in this step, by their names in the chamber. The chamber's only melt runs without being named.
 */
export interface MeltsRun {
  [k: string]: MeltRun;
}
/**
 * How this evaporation source runs in the step.
 */
export interface MeltRun {
  /**
   * Temperature of the melt's surface. Gives the speed of the atoms that leave it.
   */
  temperature?: Setpoint;
  /**
   * Distance from the melt to the wafer, where this step sets it.
   */
  throw?: Setpoint;
}
/**
 * Lengths that this step sets, where it differs from the chamber's.
 */
export interface Lengths {
  /**
   * Distance between the plates, or from the showerhead to the wafer. Feeds the gap's Knudsen number, pressure times distance and the residence time in the plasma.
   */
  gap?: Setpoint;
  /**
   * The length that the chamber's Knudsen number is taken against. Without it the smaller of diameter and height.
   */
  chamber?: Setpoint;
  /**
   * From the last wafer to the open end of a tube. Feeds the Péclet number that keeps room air out.
   */
  tail?: Setpoint;
  /**
   * Flight path of an ion or neutral beam from its source to the wafer. Feeds the beam's Knudsen number.
   */
  beam?: Setpoint;
  /**
   * Inner diameter of the line behind the chamber. Feeds its Knudsen number.
   */
  foreline?: Setpoint;
  /**
   * A length of your own: numbers of that name, such as knudsen.NAME, are taken against it.
   */
  [k: string]: Setpoint | undefined;
}
/**
 * The gas space: a cylinder, unless volume and wall area are given. Feeds residence time, the chamber's Knudsen number, wall collisions and bulk velocity.
 */
export interface Body {
  /**
   * Inner diameter of the chamber or tube.
   */
  diameter?: Fixed | Unknown;
  /**
   * Inner height of the chamber, floor to lid.
   */
  height?: Fixed | Unknown;
  /**
   * Inner length of a tube.
   */
  length?: Fixed | Unknown;
  /**
   * Lengths of a tube's heated zones, in order from the gas inlet. Kept for later: nothing is computed from it yet.
   *
   * @minItems 1
   *
   * Items: Length of this zone. Kept for later: nothing is computed from it yet.
   */
  zones?: [Fixed | Unknown, ...(Fixed | Unknown)[]];
  /**
   * How gas crosses the space. `mixed`: stirred, the same everywhere; `radial`: over a wafer from the middle outwards or back; `axial`: along a tube. Bulk velocity, Reynolds and Péclet numbers need radial or axial.
   */
  flow?: 'mixed' | 'radial' | 'axial';
  /**
   * Whole gas volume up to the throttle, measured. Wins over the cylinder. Feeds residence time, turnovers and the leak rate.
   */
  volume?: Fixed | Unknown;
  /**
   * Whole inner surface that the gas meets, measured. Wins over the cylinder. Feeds wall collisions.
   */
  wall_area?: Fixed | Unknown;
}
/**
 * Setpoints that nothing judges. Their units are checked.
 */
export interface Other {
  /**
   * Any value with its unit.
   */
  [k: string]: string | number;
}
/**
 * What the chamber holds before the first step. Kept for later: nothing is computed from it yet.
 */
export interface StartsIn {
  /**
   * Pressure before the first step. Kept for later: nothing is computed from it yet.
   */
  pressure?: Fixed | Unknown;
  /**
   * Mole fraction of this gas, bare or in percent, or `rest`. Kept for later: nothing is computed from it yet.
   */
  [k: string]: (Fixed | Unknown | Rest) | (Fixed | Unknown) | undefined;
}
/**
 * One finding that was accepted: by whom, why, how far, and until when.
 */
export interface Waiver {
  /**
   * Which finding: the assumption's name, or process and assumption with a slash.
   */
  assumption: string;
  /**
   * Value up to which it was granted. Beyond it the finding comes back. With a unit unless the number has none.
   */
  holds_to?: string | number;
  /**
   * Why the finding may stand: what was measured, and where that is written down.
   */
  reason: string;
  /**
   * Who accepted it: a role or a person.
   */
  approved_by: string;
  /**
   * Last day on which it counts, year-month-day. After it the finding comes back.
   */
  until: string;
}
/**
 * A process chamber: its shape, its pump, its gas lines and gauges with their accuracy, and the limits it is run within.
 */
export interface Chamber {
  /**
   * Says that this is a chamber document, and in which version of the format. It is the first key of the file.
   */
  regimen: 'chamber 1';
  /**
   * Names the chamber; recipes refer to it by this name.
   */
  name: string;
  /**
   * One line that says what it is, printed beside the name.
   */
  title?: string;
  /**
   * Your own revision of this document, in quotes so that 1.10 stays 1.10. It is printed with every result.
   */
  revision?: string;
  /**
   * Free text for whoever reads the document. Nothing is judged by it.
   */
  remark?: string;
  body?: Body;
  lengths?: ChamberLengths;
  inlets?: Inlets;
  generators?: Generators;
  electrode?: Electrode;
  walls?: Walls;
  chuck?: Chuck;
  pump?: Pump;
  gauges?: Gauges;
  gas_lines?: GasLines;
  flow_reference?: FlowReference;
  /**
   * Least and greatest value of a setpoint that the chamber is to be run at, by the setpoint's address. A step beyond them is a finding.
   */
  limits?: {
    [k: string]: Limits;
  };
  temperatures?: Temperatures;
  exhaust?: Exhaust;
  targets?: Targets;
  melts?: Melts;
  boat?: Boat;
}
/**
 * Lengths that Knudsen numbers, path counts and diffusion times are taken against. Throw, pitch, hole and feature come from targets and melts, boat, inlets and wafer.
 */
export interface ChamberLengths {
  /**
   * Distance between the plates, or from the showerhead to the wafer. Feeds the gap's Knudsen number, pressure times distance and the residence time in the plasma.
   */
  gap?: Fixed | Unknown;
  /**
   * The length that the chamber's Knudsen number is taken against. Without it the smaller of diameter and height.
   */
  chamber?: Fixed | Unknown;
  /**
   * From the last wafer to the open end of a tube. Feeds the Péclet number that keeps room air out.
   */
  tail?: Fixed | Unknown;
  /**
   * Flight path of an ion or neutral beam from its source to the wafer. Feeds the beam's Knudsen number.
   */
  beam?: Fixed | Unknown;
  /**
   * Inner diameter of the line behind the chamber. Feeds its Knudsen number.
   */
  foreline?: Fixed | Unknown;
  /**
   * A length of your own: numbers of that name, such as knudsen.NAME, are taken against it.
   */
  [k: string]: (Fixed | Unknown) | undefined;
}
/**
 * Plates and pipes with holes through which gas enters, by a name of your own. Feeds the hole's Knudsen number and the pressure behind the plate.
 */
export interface Inlets {
  [k: string]: Inlet;
}
/**
 * A set of equal holes.
 */
export interface Inlet {
  /**
   * How many holes share the flow.
   */
  holes?: Fixed | Unknown;
  /**
   * Diameter of one hole. Feeds its Knudsen number and conductance.
   */
  diameter: Fixed | Unknown;
  /**
   * Length of one hole, the plate's thickness.
   */
  thickness?: Fixed | Unknown;
}
/**
 * Power supplies, by the names that recipes use under `power`.
 */
export interface Generators {
  [k: string]: Generator;
}
/**
 * A power supply.
 */
export interface Generator {
  /**
   * Its frequency; without it direct current. Kept for later: nothing is computed from it yet.
   */
  frequency?: Fixed | Unknown;
  /**
   * Greatest power that it delivers. Kept for later: nothing is computed from it yet.
   */
  full_scale?: Fixed | Unknown;
}
/**
 * The plate that carries the plasma. With the gap it bounds the plasma's volume.
 */
export interface Electrode {
  /**
   * Diameter of the driven plate. Feeds the residence time in the plasma, flow per area and power density.
   */
  diameter: Fixed | Unknown;
}
/**
 * What the walls are made of, and what is known of what happens on them.
 */
export interface Walls {
  /**
   * Wall material, by its name among the walls. Kept for later: nothing is computed from it yet.
   */
  material?: string;
  recombination?: Recombination;
  /**
   * Area beside the wafers on which the film grows too, such as hot walls and boat. Without it utilisation is a lower bound, and says so.
   */
  deposited_area?: Fixed | Unknown;
}
/**
 * Probability that a radical is lost where it hits the wall, by radical, measured on this chamber. Kept for later: nothing is computed from it yet.
 */
export interface Recombination {
  /**
   * Loss probability of this radical, with a tolerance or within limits where it is known no better. Kept for later: nothing is computed from it yet.
   */
  [k: string]: Fixed | Range | Unknown;
}
/**
 * What the wafer lies on. Kept for later: nothing is computed from it yet.
 */
export interface Chuck {
  /**
   * Mean distance between wafer and chuck. Kept for later: nothing is computed from it yet.
   */
  backside_gap?: Fixed | Unknown;
  /**
   * How fully a molecule takes on the temperature of what it hits, 0 to 1, of the gas behind the wafer. Kept for later: nothing is computed from it yet.
   */
  accommodation?: Fixed | Unknown;
}
/**
 * Pumping at the chamber's port, throttle and all. An open tube has none.
 */
export interface Pump {
  /**
   * Speed at the chamber's port with the throttle open: one value, one for each gas, or one below each pressure. Tells which pressures a flow can be held at.
   */
  speed?: Fixed | Unknown | SpeedByGas | SpeedByPressure;
  /**
   * Speed with the throttle as far shut as it still controls. Tells the highest pressure that a flow can be held at.
   */
  lowest_speed?: Fixed | Unknown;
  /**
   * Speed against the throttle's position, from shut to open. Kept for later: nothing is computed from it yet.
   *
   * @minItems 2
   */
  throttle?: [ThrottlePoint, ThrottlePoint, ...ThrottlePoint[]];
  /**
   * Time that the throttle takes from shut to open. Kept for later: nothing is computed from it yet.
   */
  travel?: Fixed | Unknown;
  /**
   * Time constant with which the pressure controller follows its setpoint. Kept for later: nothing is computed from it yet.
   */
  response?: Fixed | Unknown;
  /**
   * Pressure that the empty chamber reaches. Feeds the impurities that a film takes up.
   */
  base_pressure?: Fixed | Unknown;
  /**
   * Rise of pressure with the valve shut and no flow. Gives the flow that leaks and degasses.
   */
  leak_up_rate?: Fixed | Unknown;
  residual?: Shares;
  /**
   * Temperature of the gas where it enters the pump. Without it the wall's, at most 60 degC.
   */
  temperature?: Fixed | Unknown;
  reference?: PumpReference;
}
/**
 * Speed at one position of the throttle. Kept for later: nothing is computed from it yet.
 */
export interface ThrottlePoint {
  /**
   * How far the throttle is open. Kept for later: nothing is computed from it yet.
   */
  at: Fixed | Unknown;
  /**
   * Pumping speed at that position. Kept for later: nothing is computed from it yet.
   */
  is: Fixed | Unknown;
}
/**
 * What the healthy chamber shows: a flow and the pressure that it gives with the throttle open. An idle step is held against it.
 */
export interface PumpReference {
  flows: ReferenceFlows;
  /**
   * Pressure that these flows give.
   */
  pressure: Fixed | Unknown;
}
/**
 * Flow through each line, by the line's name.
 */
export interface ReferenceFlows {
  /**
   * Flow through this line.
   */
  [k: string]: Fixed | Unknown;
}
/**
 * Pressure gauges, by a name of your own. The one that suits a setpoint gives its uncertainty.
 */
export interface Gauges {
  [k: string]: Gauge;
}
/**
 * A pressure gauge.
 */
export interface Gauge {
  /**
   * Greatest pressure that it reads.
   */
  full_scale: Fixed | Unknown;
  /**
   * How far a reading may be off: a share of the reading, a share of full scale, or a pressure. Gives the uncertainty of pressures.
   */
  accuracy?: Accuracy;
  /**
   * Least reading that still means something: a share of full scale, or a pressure.
   */
  usable_from?: Fixed | Unknown;
  /**
   * Gas for which an indirect gauge reads true. A gauge that reads every gas alike has none. Kept for later: nothing is computed from it yet.
   */
  calibrated_for?: string;
}
/**
 * Lines with their controllers, by the names that recipes use under `flows`. A line named like a gas brings that gas.
 */
export interface GasLines {
  [k: string]: GasLine;
}
/**
 * One line: what it brings, and how far and how well its controller measures.
 */
export interface GasLine {
  /**
   * What flows through it: a gas, or the shares in a mixed cylinder. Without it the gas that the line is named after.
   */
  brings?: string | Shares;
  draws?: Draws;
  bubbles?: Bubbles;
  delivers?: Delivers;
  /**
   * Greatest flow that the controller passes.
   */
  full_scale?: Fixed | Unknown;
  /**
   * How far the flow may be off: a share of the reading, a share of full scale, or a flow. Gives the uncertainty of flows.
   */
  accuracy?: Accuracy;
  /**
   * Time constant with which the flow follows its setpoint. Kept for later: nothing is computed from it yet.
   */
  response?: Fixed | Unknown;
}
/**
 * Vapour drawn from a liquid or solid by its own pressure, without a controller.
 */
export interface Draws {
  /**
   * Gas that evaporates from the source.
   */
  gas: string;
  /**
   * Temperature of the source. Kept for later: nothing is computed from it yet.
   */
  temperature?: Fixed | Unknown;
}
/**
 * A carrier that is led through a liquid and takes its vapour along. The flow that a step names is the carrier's.
 */
export interface Bubbles {
  /**
   * Gas that evaporates from the liquid.
   */
  gas: string;
  /**
   * Temperature of the liquid. Gives the vapour pressure.
   */
  temperature?: Fixed | Unknown;
  /**
   * Pressure in the vessel. With the vapour pressure it gives how much vapour each part of carrier takes along.
   */
  pressure?: Fixed | Unknown;
  /**
   * Gas that is led through.
   */
  carrier: string;
}
/**
 * What a calibration found: the true flow is gain times the set flow, plus offset.
 */
export interface Delivers {
  /**
   * True flow over set flow. Without it 1.
   */
  gain?: Fixed | Unknown;
  /**
   * True flow when the set flow is zero. Without it none.
   */
  offset?: Fixed | Unknown;
}
/**
 * The state that `standard` means in sccm and slm on this chamber. Without it 0 degC and 101325 Pa, as in SEMI E12.
 */
export interface FlowReference {
  /**
   * Temperature of the standard state.
   */
  temperature?: Fixed | Unknown;
  /**
   * Pressure of the standard state.
   */
  pressure?: Fixed | Unknown;
}
/**
 * A lower limit, an upper limit, or both; the unit follows the address they stand at.
 */
export interface Limits {
  /**
   * Lower limit, with the unit of what it limits.
   */
  at_least?: string | number;
  /**
   * Upper limit, with the unit of what it limits.
   */
  at_most?: string | number;
}
/**
 * What is done with the gas behind the pump. Kept for later: nothing is computed from it yet.
 */
export interface Exhaust {
  /**
   * Inert gas that is added behind the pump. Kept for later: nothing is computed from it yet.
   */
  dilution: Fixed | Unknown;
}
/**
 * Sputter targets, by a name of your own.
 */
export interface Targets {
  [k: string]: Target;
}
/**
 * A sputter target.
 */
export interface Target {
  /**
   * Atom that leaves it, or the shares of an alloy.
   */
  material: string | Shares;
  /**
   * Distance from the target to the wafer. Feeds how many collisions the atoms suffer on their way.
   */
  throw?: Fixed | Unknown;
  /**
   * Name of the generator that drives it, one of those of the chamber. Kept for later: nothing is computed from it yet.
   */
  generator?: string;
}
/**
 * Evaporation sources, by a name of your own.
 */
export interface Melts {
  [k: string]: Melt;
}
/**
 * An evaporation source.
 */
export interface Melt {
  /**
   * Atom that leaves it, or the shares of an alloy.
   */
  material: string | Shares;
  /**
   * Distance from the melt to the wafer. Feeds the share of atoms that arrive without a collision.
   */
  throw?: Fixed | Unknown;
}
/**
 * What holds the wafers of a batch furnace.
 */
export interface Boat {
  /**
   * How many wafers the boat can hold. How many it does hold is the recipe's count. Kept for later: nothing is computed from it yet.
   */
  slots?: Fixed | Unknown;
  /**
   * From one wafer to the next. Numbers of the length pitch, such as knudsen.pitch, are taken against it.
   */
  pitch?: Fixed | Unknown;
}
/**
 * Gases, atoms, films, ions and walls that a site adds to the built-in ones, or whose values it replaces.
 */
export interface Substances {
  /**
   * Says that this is a substances document, and in which version of the format. It is the first key of the file.
   */
  regimen: 'substances 1';
  /**
   * Names the document.
   */
  name?: string;
  /**
   * One line that says what it is, printed beside the name.
   */
  title?: string;
  /**
   * Your own revision of this document, in quotes so that 1.10 stays 1.10.
   */
  revision?: string;
  /**
   * Free text for whoever reads the document. Nothing is judged by it.
   */
  remark?: string;
  gases?: Gases;
  atoms?: Atoms;
  films?: Films;
  ions?: Ions;
  /**
   * Wall materials, by the names that chambers use. Kept for later: nothing is computed from it yet.
   */
  walls?: {
    [k: string]: Wall;
  };
}
/**
 * Gases and vapours, by the names that lines and recipes use. One of a built-in name overrides the values that it gives.
 */
export interface Gases {
  [k: string]: Gas;
}
/**
 * A gas or vapour. A block of values carries its own source; for single values the gas's own `source` stands.
 */
export interface Gas {
  /**
   * Its name in words.
   */
  title?: string;
  /**
   * Chemical formula, brackets allowed. The element balance counts its atoms.
   */
  formula?: string;
  /**
   * Mass of a mole. Feeds every speed, flux and collision.
   */
  molar_mass?: Fixed | SourcedMolarMass;
  collision?: Collision;
  critical?: CriticalPoint;
  /**
   * Dipole moment. Enters collisions where the values were fitted with it.
   */
  dipole?: Fixed | SourcedDipole;
  accuracy?: GasAccuracy;
  heat_capacity?: HeatCapacity;
  vapour_pressure?: VapourPressure;
  breakdown?: Breakdown;
  /**
   * Whether the gas stays on surfaces, as water, ammonia and metal halides do. Kept for later: nothing is computed from it yet.
   */
  clings?: boolean;
  /**
   * Temperature above which the gas falls apart. Kept for later: nothing is computed from it yet.
   */
  decomposes_above?: Fixed | SourcedTemperature;
  /**
   * How its molecules join, in words, where its numbers then no longer hold. Printed where the gas is shown.
   */
  associates?: string;
  /**
   * Whether it takes no part in any reaction here. An inert gas is no impurity.
   */
  inert?: boolean;
  /**
   * What cautions name when a step uses the gas. Nothing is judged by them.
   *
   * Items: One kind of hazard.
   */
  hazards?: ('flammable' | 'pyrophoric' | 'toxic' | 'corrosive' | 'oxidising' | 'asphyxiant')[];
  flammable_range?: FlammableRange;
  /**
   * Free text for whoever reads the document.
   */
  remark?: string;
  /**
   * What a reader of its numbers should know. Printed where the substance is shown.
   *
   * Items: One thing to know.
   */
  remarks?: string[];
  /**
   * Where the single values of this gas are from.
   */
  source?: string;
}
/**
 * The pair potential of two molecules. Feeds mean free path, viscosity and diffusivity.
 */
export interface Collision {
  /**
   * Distance at which the potential is zero, the Lennard-Jones sigma.
   */
  diameter: Fixed;
  /**
   * Depth of the potential over Boltzmann's constant, in K.
   */
  well_depth: Fixed;
  /**
   * Potential that the values were fitted with: `lennard-jones`, or `stockmayer` where the dipole was part of the fit.
   */
  form: 'lennard-jones' | 'stockmayer';
  /**
   * Named correlation that gave the values, where nobody measured them. They are then marked wherever they enter.
   */
  estimated?: string;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * Critical constants. Where no collision values are given they are estimated from these, and marked.
 */
export interface CriticalPoint {
  /**
   * Critical temperature.
   */
  temperature: Fixed;
  /**
   * Critical pressure.
   */
  pressure: Fixed;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * Standard uncertainty of what follows from the collision values, as a share. It moves all numbers that rest on this gas together.
 */
export interface GasAccuracy {
  /**
   * Standard uncertainty of viscosity and mean free path.
   */
  viscosity: Fixed;
  /**
   * Standard uncertainty of diffusivities.
   */
  diffusion: Fixed;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * Molar heat capacity at constant pressure, by temperature. Feeds thermal conductivity and the Rayleigh number; between two points it is taken as straight.
 */
export interface HeatCapacity {
  /**
   * Values from low to high temperature.
   *
   * @minItems 1
   */
  at: [HeatCapacityPoint, ...HeatCapacityPoint[]];
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * Heat capacity at one temperature.
 */
export interface HeatCapacityPoint {
  /**
   * Temperature of this value.
   */
  temperature: Fixed;
  /**
   * Molar heat capacity at constant pressure.
   */
  is: Fixed;
}
/**
 * Antoine's equation in SI: the decimal logarithm of p in Pa is a - b/(T + c), T in K. Feeds lines that bubble, and the check that a vapour does not condense.
 */
export interface VapourPressure {
  /**
   * First constant.
   */
  a: number;
  /**
   * Second constant, in K.
   */
  b: number;
  /**
   * Third constant, in K.
   */
  c: number;
  /**
   * Least temperature of the fit.
   */
  from: Fixed;
  /**
   * Greatest temperature of the fit.
   */
  to: Fixed;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * Townsend's constants of the gas in SI. Kept for later: nothing is computed from it yet.
 */
export interface Breakdown {
  /**
   * Ionisations over pressure and length, in 1/(Pa m). Kept for later: nothing is computed from it yet.
   */
  a: number;
  /**
   * Field over pressure, in V/(Pa m). Kept for later: nothing is computed from it yet.
   */
  b: number;
  /**
   * Least field over pressure of the fit, in V/(Pa m). Kept for later: nothing is computed from it yet.
   */
  from?: number;
  /**
   * Greatest field over pressure of the fit, in V/(Pa m). Kept for later: nothing is computed from it yet.
   */
  to?: number;
  /**
   * Electrons set free for each ion that hits the cathode. Kept for later: nothing is computed from it yet.
   */
  secondary_emission?: Fixed;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * Shares in air between which it burns. Kept for later: nothing is computed from it yet.
 */
export interface FlammableRange {
  /**
   * Least share in air that burns. Kept for later: nothing is computed from it yet.
   */
  at_least: Fixed;
  /**
   * Greatest share in air that burns. Kept for later: nothing is computed from it yet.
   */
  at_most?: Fixed;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * Atoms that leave targets and melts, by their symbols.
 */
export interface Atoms {
  [k: string]: Atom;
}
/**
 * An atom that leaves a target or a melt.
 */
export interface Atom {
  /**
   * Its name in words.
   */
  title?: string;
  /**
   * Chemical formula, brackets allowed. The element balance counts its atoms.
   */
  formula?: string;
  /**
   * Mass of a mole. Feeds how much energy each collision takes.
   */
  molar_mass?: Fixed | SourcedMolarMass;
  /**
   * Charge of the nucleus. Feeds the cross-section of fast atoms.
   */
  atomic_number?: number;
  /**
   * Energy that holds an atom at the surface. Sets the energy at which sputtered atoms leave.
   */
  sublimation_enthalpy?: Fixed | SourcedEnergy;
  /**
   * Static dipole polarisability in cubic angstrom, without a unit. The built-in pairs were estimated from it. Kept for later: nothing is computed from it yet.
   */
  polarisability_angstrom3?: Fixed | SourcedNumber;
  pairs?: Pairs;
  /**
   * Free text for whoever reads the document.
   */
  remark?: string;
  /**
   * What a reader of its numbers should know. Printed where the substance is shown.
   *
   * Items: One thing to know.
   */
  remarks?: string[];
  /**
   * Where the single values of this atom are from.
   */
  source?: string;
}
/**
 * Pair potential of this atom with each gas.
 */
export interface Pairs {
  [k: string]: Pair;
}
/**
 * Potential between the atom and one gas.
 */
export interface Pair {
  /**
   * Distance at which the potential is zero, the Lennard-Jones sigma.
   */
  diameter: Fixed;
  /**
   * Depth of the potential over Boltzmann's constant, in K.
   */
  well_depth: Fixed;
  /**
   * Named correlation that gave the values, where nobody measured them. They are then marked wherever they enter.
   */
  estimated?: string;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * Films that are grown, etched or sputtered, by the names that recipes use.
 */
export interface Films {
  [k: string]: Film;
}
/**
 * A solid that is grown, etched or sputtered.
 */
export interface Film {
  /**
   * Its name in words.
   */
  title?: string;
  /**
   * Chemical formula, brackets allowed. The element balance counts its atoms.
   */
  formula?: string;
  /**
   * Mass density of the film as grown. With the rate it gives the flux of atoms.
   */
  density?: Fixed | SourcedDensity;
  /**
   * Mass of a mole of formula units.
   */
  molar_mass?: Fixed | SourcedMolarMass;
  /**
   * Sites on an area of its surface. Kept for later: nothing is computed from it yet.
   */
  site_density?: Fixed | SourcedSiteDensity;
  /**
   * Free text for whoever reads the document.
   */
  remark?: string;
  /**
   * What a reader of its numbers should know. Printed where the substance is shown.
   *
   * Items: One thing to know.
   */
  remarks?: string[];
  /**
   * Where the single values of this film are from.
   */
  source?: string;
}
/**
 * Ions that cross a sheath, by the names that recipes use. Kept for later: nothing is computed from it yet.
 */
export interface Ions {
  [k: string]: Ion;
}
/**
 * An ion that crosses the sheath. Kept for later: nothing is computed from it yet.
 */
export interface Ion {
  /**
   * Its name in words.
   */
  title?: string;
  /**
   * Chemical formula, brackets allowed. Kept for later: nothing is computed from it yet.
   */
  formula?: string;
  /**
   * Mass of a mole. Without it that of the gas of its name. Kept for later: nothing is computed from it yet.
   */
  molar_mass?: Fixed | SourcedMolarMass;
  cross_sections?: CrossSections;
  charge_exchange?: ChargeExchange;
  /**
   * Free text for whoever reads the document.
   */
  remark?: string;
  /**
   * What a reader of its numbers should know. Printed where the substance is shown.
   *
   * Items: One thing to know.
   */
  remarks?: string[];
  /**
   * Where the single values of this ion are from.
   */
  source?: string;
}
/**
 * Cross-section for losing its direction in a collision, by gas. Kept for later: nothing is computed from it yet.
 */
export interface CrossSections {
  [k: string]: CrossSection;
}
/**
 * One value, or values by energy, with their source. Kept for later: nothing is computed from it yet.
 */
export interface CrossSection {
  /**
   * The cross-section at the energies of a sheath. Kept for later: nothing is computed from it yet.
   */
  is?: Fixed;
  /**
   * Cross-sections from low to high energy. Kept for later: nothing is computed from it yet.
   *
   * @minItems 1
   */
  at?: [CrossSectionPoint, ...CrossSectionPoint[]];
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * Cross-section at one energy. Kept for later: nothing is computed from it yet.
 */
export interface CrossSectionPoint {
  /**
   * Energy of the ion. Kept for later: nothing is computed from it yet.
   */
  energy: Fixed;
  /**
   * Cross-section at that energy. Kept for later: nothing is computed from it yet.
   */
  is: Fixed;
}
/**
 * Cross-section for handing over its charge, by gas. Kept for later: nothing is computed from it yet.
 */
export interface ChargeExchange {
  [k: string]: CrossSection;
}
/**
 * A wall material. Kept for later: nothing is computed from it yet.
 */
export interface Wall {
  /**
   * Its name in words.
   */
  title?: string;
  /**
   * Probability that a radical is lost where it hits the wall, by radical. Kept for later: nothing is computed from it yet.
   */
  recombination?: {
    [k: string]: Probability;
  };
  accommodation?: Accommodation;
  /**
   * Free text for whoever reads the document.
   */
  remark?: string;
  /**
   * What a reader of its numbers should know. Printed where the substance is shown.
   *
   * Items: One thing to know.
   */
  remarks?: string[];
  /**
   * Where the single values of this wall are from.
   */
  source?: string;
}
/**
 * A probability between 0 and 1 with its source. Kept for later: nothing is computed from it yet.
 */
export interface Probability {
  /**
   * The value, with a tolerance, or within limits where it is known no better. Kept for later: nothing is computed from it yet.
   */
  is: Fixed | Range | Unknown;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * How fully a gas takes on the wall's temperature, by gas. Kept for later: nothing is computed from it yet.
 */
export interface Accommodation {
  [k: string]: Probability;
}
/**
 * An intended process, as the assumptions that it makes: numbers, bounds, and where the bounds are from.
 */
export interface Process {
  /**
   * Says that this is a process document, and in which version of the format. It is the first key of the file.
   */
  regimen: 'process 1';
  /**
   * Names the process; steps refer to it by this name. One of a built-in name replaces it.
   */
  name: string;
  /**
   * One line that says what the process is, printed in lists.
   */
  title: string;
  /**
   * Your own revision of this document, in quotes so that 1.10 stays 1.10.
   */
  revision?: string;
  /**
   * What the process relies on, in a sentence or two.
   */
  remark?: string;
  /**
   * Name of a process whose assumptions, shows, usual ranges and stand-ins hold here too, but for those that stand here under the same name.
   */
  based_on?: string;
  assumptions?: Assumptions;
  /**
   * Numbers that are printed beside the judged ones and never judged.
   *
   * Items: Name of one number.
   */
  shows?: string[];
  usual?: Usual;
  stands_in?: StandsIn;
}
/**
 * What the process relies on, by names of your own. A finding is named process/assumption.
 */
export interface Assumptions {
  [k: string]: Assumption;
}
/**
 * One thing that the process relies on: a number and the bound that it has to keep.
 */
export interface Assumption {
  /**
   * What has to be true, in one sentence that a reader of a finding understands.
   */
  statement: string;
  /**
   * The number that is judged, by its name: its id, then where needed a length and a subject.
   */
  quantity: string;
  /**
   * A second number or setpoint; what is judged is then the quantity divided by it.
   */
  over?: string;
  /**
   * Lower bound: one limit with its `level`, or a limit for each grade. With a unit unless the number has none.
   */
  at_least?: number | string | Grades;
  /**
   * Upper bound: one limit with its `level`, or a limit for each grade. With a unit unless the number has none.
   */
  at_most?: number | string | Grades;
  /**
   * Grade of a bound that is one plain limit: note, warning or error.
   */
  level?: 'note' | 'warning' | 'error';
  /**
   * `given`: judged only where the recipe supplies the optional inputs; else it does not apply.
   */
  when?: 'given';
  /**
   * Grade of a review whose uncertainty is mostly that of assumed values. Without it note.
   */
  review_level?: 'note' | 'warning' | 'error';
  /**
   * Addresses of setpoints that may be moved to meet the bound. A finding points at the first of them that the recipe states; where the bound would be met is not solved for yet.
   *
   * Items: Address of one setpoint.
   */
  cure?: string[];
  /**
   * What a reader of a finding should know beside the statement.
   */
  remark?: string;
  /**
   * Where the bound is from: a publication, common practice, a qualification of your own.
   */
  source: string;
}
/**
 * Range in which such a process is usually run, by the setpoint's address. A setpoint beyond it by a factor of ten gets a note that asks whether the unit is right.
 */
export interface Usual {
  [k: string]: Limits;
}
/**
 * Values for what recipes seldom know, by address, with an honest tolerance or within limits. They show as assumed wherever they enter.
 */
export interface StandsIn {
  /**
   * A value with its unit and tolerance, or limits that it lies within.
   */
  [k: string]: string | number | Limits;
}
/**
 * The document at the root of a recipe repository, regimen.yaml: where everything is, and what holds for the whole site.
 */
export interface Site {
  /**
   * Says that this is a site document, and in which version of the format. It is the first key of the file.
   */
  regimen: 'site 1';
  /**
   * Names the site.
   */
  name: string;
  /**
   * One line that says what it is, printed beside the name.
   */
  title?: string;
  /**
   * Your own revision of this document, in quotes so that 1.10 stays 1.10.
   */
  revision?: string;
  /**
   * Free text for whoever reads the document. Nothing is judged by it.
   */
  remark?: string;
  /**
   * Where the chambers are. Patterns relative to this file; `*` stands for any name, `**` for any folders. Nothing above this file's folder is reached.
   *
   * Items: Path or pattern with forward slashes.
   */
  chambers?: string[];
  /**
   * Where the site's own gases, films and walls are. Patterns relative to this file; `*` stands for any name, `**` for any folders. Nothing above this file's folder is reached.
   *
   * Items: Path or pattern with forward slashes.
   */
  substances?: string[];
  /**
   * Where the site's own processes are. Patterns relative to this file; `*` stands for any name, `**` for any folders. Nothing above this file's folder is reached.
   *
   * Items: Path or pattern with forward slashes.
   */
  processes?: string[];
  /**
   * Where the recipes are. Patterns relative to this file; `*` stands for any name, `**` for any folders. Nothing above this file's folder is reached.
   *
   * Items: Path or pattern with forward slashes.
   */
  recipes?: string[];
  /**
   * What a walk leaves out. Patterns relative to this file; `*` stands for any name, `**` for any folders. Nothing above this file's folder is reached.
   *
   * Items: Path or pattern with forward slashes.
   */
  pass_over?: string[];
  show?: Show;
  clearing?: Clearing;
  tolerances?: Tolerances;
  ratios?: Ratios;
}
/**
 * How numbers are printed: units, the names of regimes, and how wide an uncertainty is stated.
 */
export interface Show {
  /**
   * Names and edges of the regimes. `gas-dynamics`: continuum, slip, transition, free-molecular at 0.01, 0.1 and 10; `vacuum`: viscous, intermediate, molecular at 0.01 and 0.5.
   */
  bands?: 'gas-dynamics' | 'vacuum';
  /**
   * How many standard uncertainties are stated, and counted when a bound is held against a number. Without it 2.
   */
  coverage_factor?: number;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  pressure?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  length?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  temperature?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  time?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  flow?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  amount?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  speed?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  pressure_rate?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  rate?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  power?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  power_density?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  voltage?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  energy?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  frequency?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  area?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  volume?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  fraction?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  number_density?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  current_density?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  exposure?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  flux?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  pressure_length?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  diffusivity?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  density?: string;
  /**
   * Unit in which such numbers are printed, as documents write it. Without it the unit that the recipe uses.
   */
  velocity?: string;
}
/**
 * How long a gas that clings takes to leave the walls, by gas and wall temperature, measured here. Kept for later: nothing is computed from it yet.
 */
export interface Clearing {
  /**
   * Times from low to high wall temperature. Kept for later: nothing is computed from it yet.
   *
   * @minItems 1
   */
  [k: string]: [ClearingPoint, ...ClearingPoint[]];
}
/**
 * Time to leave at one wall temperature. Kept for later: nothing is computed from it yet.
 */
export interface ClearingPoint {
  /**
   * Wall temperature. Kept for later: nothing is computed from it yet.
   */
  wall: Fixed | Unknown;
  /**
   * Time after which no more of it comes off the wall. Kept for later: nothing is computed from it yet.
   */
  time: Fixed | Unknown;
}
/**
 * Half-widths that stand in where a value gives no tolerance and no gauge or line does.
 */
export interface Tolerances {
  /**
   * Tolerance of times.
   */
  time?: Accuracy;
  /**
   * Tolerance of temperatures.
   */
  temperature?: Accuracy;
  /**
   * Tolerance of pressures.
   */
  pressure?: Accuracy;
  /**
   * Tolerance of flows.
   */
  flow?: Accuracy;
  /**
   * Tolerance of generator powers.
   */
  power?: Accuracy;
  /**
   * Tolerance of lengths.
   */
  length?: Accuracy;
}
/**
 * Flow ratios that have to hold at every instant, by names of your own. Findings are named site/NAME.
 */
export interface Ratios {
  [k: string]: Ratio;
}
/**
 * One flow ratio that has to hold at every instant. With the dividend there and the divisor not, it is above every bound; with neither it does not apply.
 */
export interface Ratio {
  /**
   * Gas whose flow is divided.
   */
  of: string;
  /**
   * Gas whose flow it is divided by.
   */
  to: string;
  /**
   * Lower bound: one limit with its `level`, or a limit for each grade. With a unit unless the number has none.
   */
  at_least?: number | string | Grades;
  /**
   * Upper bound: one limit with its `level`, or a limit for each grade. With a unit unless the number has none.
   */
  at_most?: number | string | Grades;
  /**
   * Grade of a bound that is one plain limit: note, warning or error.
   */
  level?: 'note' | 'warning' | 'error';
  /**
   * Chambers on which it holds. Without it all.
   *
   * @minItems 1
   *
   * Items: Name of one chamber.
   */
  chambers?: [string, ...string[]];
  /**
   * Why the ratio matters, in one sentence for a reader of a finding.
   */
  statement?: string;
  /**
   * Where the bound is from.
   */
  source?: string;
}
/**
 * Pumping speed for each gas, by its name.
 */
export interface SpeedByGas {
  /**
   * Speed for this gas.
   */
  [k: string]: Fixed | Unknown;
}
/**
 * Speed below one pressure.
 */
export interface SpeedRow {
  /**
   * Pressure up to which this speed holds.
   */
  below?: Fixed | Unknown;
  /**
   * Pumping speed below that pressure.
   */
  is: Fixed | Unknown;
}
/**
 * A bound with a limit for each grade; the gravest limit that the number crosses decides.
 */
export interface Grades {
  /**
   * Limit beyond which the finding is worth knowing.
   */
  note?: string | number;
  /**
   * Limit beyond which the step should be looked at.
   */
  warning?: string | number;
  /**
   * Limit beyond which the intended process is not what happens.
   */
  error?: string | number;
}
/**
 * Temperatures of a tube's heated zones, in order from the gas inlet.
 */
export interface Zones {
  /**
   * One temperature for each heated zone, in order from the gas inlet.
   *
   * @minItems 1
   *
   * Items: Temperature of this zone.
   */
  zones: [Setpoint, ...Setpoint[]];
}
/**
 * Gas, pressure and heat behind the wafer. Kept for later: nothing is computed from it yet.
 */
export interface BacksideGas {
  /**
   * Gas that carries the heat. Kept for later: nothing is computed from it yet.
   */
  gas: string;
  /**
   * Pressure behind the wafer. Kept for later: nothing is computed from it yet.
   */
  pressure?: Setpoint;
  /**
   * Heat that the wafer takes up from the process. Kept for later: nothing is computed from it yet.
   */
  heat_load?: Setpoint;
}
/**
 * A round wafer by its diameter, or a panel by its width and length.
 */
export interface Substrate {
  /**
   * Diameter of a round wafer.
   */
  diameter?: Setpoint;
  /**
   * Width of a panel.
   */
  width?: Setpoint;
  /**
   * Length of a panel.
   */
  length?: Setpoint;
  /**
   * Thickness of a wafer. Kept for later: nothing is computed from it yet.
   */
  thickness?: Setpoint;
  /**
   * How many wafers are in the chamber at once. Without it one.
   */
  count?: Setpoint;
  /**
   * Faces of each wafer that take part: one, or two in a furnace. Without it one.
   */
  coated_faces?: Setpoint;
  /**
   * The hole or trench that the process has to reach into; `none` for a blank wafer.
   */
  feature?: Feature | 'none' | 'unknown';
}
/**
 * A hole or a trench in the wafer's face.
 */
export interface Feature {
  /**
   * A round hole or a long trench. Kept for later: nothing is computed from it yet.
   */
  shape: 'hole' | 'trench';
  /**
   * Diameter of the hole, width of the trench. Feeds the feature's Knudsen number.
   */
  width?: Setpoint;
  /**
   * Depth to the bottom, mask included. Kept for later: nothing is computed from it yet.
   */
  depth?: Setpoint;
}
/**
 * Steps that repeat, in order. Cycles may hold cycles.
 */
export interface Cycle {
  /**
   * Names the step or cycle, once among its neighbours. Joined to the names of its cycles it is the path by which every report and command names it.
   */
  name: string;
  /**
   * How often the steps are run through. Gives the whole time of the recipe, of a range by its usual value.
   */
  repeat: Setpoint;
  /**
   * What ends the step or cycle where it is not the clock. Free text, never judged.
   */
  ends_on?: string;
  /**
   * Free text for whoever reads the recipe. Nothing is judged by it.
   */
  remark?: string;
  throughout?: Throughout;
  steps: Steps;
  waivers?: Waivers;
}
/**
 * One step: what is set while it runs, and the process that it is meant to be.
 */
export interface Step {
  /**
   * Names the step or cycle, once among its neighbours. Joined to the names of its cycles it is the path by which every report and command names it.
   */
  name: string;
  /**
   * The intended process, whose assumptions are held against the numbers of this step. `unassessed` judges nothing and needs a reason.
   */
  process: string;
  /**
   * Why the step is `unassessed`.
   */
  reason?: string;
  /**
   * What ends the step or cycle where it is not the clock. Free text, never judged.
   */
  ends_on?: string;
  /**
   * Free text for whoever reads the recipe. Nothing is judged by it.
   */
  remark?: string;
  /**
   * How long the step lasts. Feeds turnovers and exposure; a range is judged at the usual value and at both limits.
   */
  time?: Setpoint;
  /**
   * Total pressure in the chamber that the step holds. Feeds the mean free path, and with it nearly every number of the step.
   */
  pressure?: Setpoint;
  /**
   * Stands in place of a pressure where the valve is set and the pressure follows: open, closed, or how far open. With the throttle open the pressure is what the pump leaves. A position is kept for later: no pressure is computed from it yet.
   */
  throttle?: Setpoint | 'open' | 'closed';
  /**
   * Pressure at which a soak with the valve shut begins. Goes with `throttle: closed`.
   */
  fill_to?: Setpoint;
  flows?: Flows;
  composition?: Shares;
  temperatures?: Temperatures;
  power?: Power;
  duty?: Duty;
  plasma?: Plasma;
  surface?: Surface;
  reactant?: Reactant;
  targets?: TargetsRun;
  melts?: MeltsRun;
  lengths?: Lengths;
  /**
   * Gas behind the wafer; `none` where there is none. Kept for later: nothing is computed from it yet.
   */
  backside?: BacksideGas | 'none' | 'unknown';
  body?: Body;
  /**
   * What lies in the chamber; `none` where nothing does. Its area feeds utilisation, flow per area and power density.
   */
  wafer?: Substrate | 'none' | 'unknown';
  other?: Other;
  waivers?: Waivers;
}
/**
 * A value with a source of its own.
 */
export interface SourcedMolarMass {
  /**
   * The value, with a tolerance where it is known.
   */
  is: Fixed;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * A value with a source of its own.
 */
export interface SourcedDipole {
  /**
   * The value, with a tolerance where it is known.
   */
  is: Fixed;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * A value with a source of its own.
 */
export interface SourcedTemperature {
  /**
   * The value, with a tolerance where it is known.
   */
  is: Fixed;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * A value with a source of its own.
 */
export interface SourcedEnergy {
  /**
   * The value, with a tolerance where it is known.
   */
  is: Fixed;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * A value with a source of its own.
 */
export interface SourcedDensity {
  /**
   * The value, with a tolerance where it is known.
   */
  is: Fixed;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * A value with a source of its own.
 */
export interface SourcedSiteDensity {
  /**
   * The value, with a tolerance where it is known.
   */
  is: Fixed;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
/**
 * A value with a source of its own.
 */
export interface SourcedNumber {
  /**
   * The value, with a tolerance where it is known.
   */
  is: Fixed;
  /**
   * Where the values are from: a publication, a measurement of your own.
   */
  source: string;
}
