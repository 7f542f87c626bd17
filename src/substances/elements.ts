/** Symbols of the elements in the order of their atomic numbers, up to radon. */
const SYMBOLS =
  'H He Li Be B C N O F Ne Na Mg Al Si P S Cl Ar K Ca Sc Ti V Cr Mn Fe Co Ni Cu Zn Ga Ge As Se Br Kr Rb Sr Y Zr Nb Mo Tc Ru Rh Pd Ag Cd In Sn Sb Te I Xe Cs Ba La Ce Pr Nd Pm Sm Eu Gd Tb Dy Ho Er Tm Yb Lu Hf Ta W Re Os Ir Pt Au Hg Tl Pb Bi Po At Rn'.split(
    ' ',
  );

/** Atomic number of an element; undefined for what is none. */
export function atomicNumber(symbol: string): number | undefined {
  const index = SYMBOLS.indexOf(symbol);
  return index === -1 ? undefined : index + 1;
}
