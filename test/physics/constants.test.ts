import { expect, test } from "vitest";
import {
  ATOMIC_MASS_CONSTANT,
  CHARGE_PER_ATOMIC_MASS,
  CONSTANTS_EDITION,
  ELECTRON_MASS_U,
  ELEMENTARY_CHARGE,
} from "../../services/physics/constants.ts";
import { expectWithin, relativeError } from "../measured-bound.ts";

test("the edition is the one that the numbers come from", () => {
  expect(CONSTANTS_EDITION).toBe("CODATA 2022");
});

// NIST, CODATA internationally recommended values 2022 (from memory): the electron's mass in kg and its mass-to-charge
// quotient stand in the same table, so that three stored numbers are checked against two that are not stored.
const ELECTRON_MASS_KG = 9.1093837139e-31;
const ELECTRON_CHARGE_PER_MASS = 1.75882000838e11;

test("the constants agree among each other with the electron's mass and specific charge of the same edition", () => {
  expectWithin(2e-11, [
    {
      at: "m_e in kg",
      error: relativeError(ELECTRON_MASS_U * ATOMIC_MASS_CONSTANT, ELECTRON_MASS_KG),
    },
    {
      at: "e/m_e",
      error: relativeError(CHARGE_PER_ATOMIC_MASS / ELECTRON_MASS_U, ELECTRON_CHARGE_PER_MASS),
    },
  ]);
});

test("a mole of elementary charges over a gram is the Faraday constant over the molar mass constant", () => {
  // F = 96485.33212 C/mol, exact digits by the SI (9th brochure, 2019); M_u = 1.00000000105e-3 kg/mol (CODATA 2022).
  const molarMassConstant = 1.00000000105e-3;
  expectWithin(1e-11, [
    { at: "F/M_u", error: relativeError(CHARGE_PER_ATOMIC_MASS, 96485.33212331 / molarMassConstant) },
  ]);
  expect(ELEMENTARY_CHARGE).toBe(1.602176634e-19);
});
