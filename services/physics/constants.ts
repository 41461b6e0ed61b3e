/** Edition of the CODATA adjustment from which every constant of this file is taken. */
export const CONSTANTS_EDITION = "CODATA 2022";

/** Elementary charge in C; exact by the definition of the SI (9th brochure, 2019). */
export const ELEMENTARY_CHARGE = 1.602176634e-19;

/** Atomic mass constant (1 u) in kg; CODATA 2022, relative uncertainty 3.1e-10. */
export const ATOMIC_MASS_CONSTANT = 1.66053906892e-27;

/** Electron mass in u; CODATA 2022 (5.485 799 090 441(97)e-4). */
export const ELECTRON_MASS_U = 5.485799090441e-4;

/** Charge of one elementary charge over the mass of one u, in C/kg. */
export const CHARGE_PER_ATOMIC_MASS = ELEMENTARY_CHARGE / ATOMIC_MASS_CONSTANT;
