/** k, Boltzmann constant [J/K], exact. BIPM, SI Brochure, 9th ed. 2019. */
export const BOLTZMANN = 1.380649e-23;
/** N_A, Avogadro constant [1/mol], exact. BIPM, SI Brochure, 9th ed. 2019. */
export const AVOGADRO = 6.02214076e23;
/** R, molar gas constant [J/(mol K)], exact: k N_A. BIPM, SI Brochure, 9th ed. 2019. */
export const GAS_CONSTANT = BOLTZMANN * AVOGADRO;
/** e, elementary charge [C], exact; also the joule in an electronvolt. BIPM, SI Brochure, 9th ed. 2019. */
export const ELEMENTARY_CHARGE = 1.602176634e-19;
/** u, atomic mass constant [kg]. CODATA 2022. */
export const ATOMIC_MASS = 1.66053906892e-27;
/** m_e, electron mass [kg]. CODATA 2022. */
export const ELECTRON_MASS = 9.1093837139e-31;
/** ε0, vacuum electric permittivity [F/m]. CODATA 2022. */
export const VACUUM_PERMITTIVITY = 8.8541878188e-12;
/** g, standard acceleration of gravity [m/s2], by convention. BIPM, 3rd CGPM 1901. */
export const STANDARD_GRAVITY = 9.80665;
/** Temperature to which a standard flow is referred [K]: 0 degC. SEMI E12. */
export const STANDARD_TEMPERATURE = 273.15;
/** Pressure to which a standard flow is referred [Pa]: one atmosphere. SEMI E12. */
export const STANDARD_PRESSURE = 101325;
/** Debye, unit of dipole moments [C m]: 1e-21/c, with c = 299792458 m/s exactly. */
export const DEBYE = 1e-21 / 299792458;
