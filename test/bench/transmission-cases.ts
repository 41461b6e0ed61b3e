import { aOf, qOf } from "../../services/physics/mathieu-parameters.ts";
import { setPointOf } from "../../services/physics/set-point.ts";
import { peakProfileOf } from "../../services/physics/transmission/peak-profile.ts";
import { transmissionOf } from "../../services/physics/transmission/transmission.ts";
import type { BenchCase, Side } from "./bench-case.ts";
import { monteCarloTransmission } from "./transmission-monte-carlo.ts";

/* A window 0.7 wide at m/z 500, 80 RF cycles, a beam of 0.1 r0 and 0.1 eV mean radial energy per charge. */
const FIELD = { fieldRadius: 0.004, frequency: 1.2e6 };
const RF_CYCLES = 80;
const VELOCITY = 138.914;
const BEAM = { sigmaX: 4e-4, sigmaY: 4e-4, sigmaVx: VELOCITY, sigmaVy: VELOCITY };
const MZ = [499.8, 500, 500.2];
/** At the centre of this peak, about 0.075: what a standard error of 1e-3 costs, T(1 − T)/1e-6. */
const IONS = 69_375;
const CHECKS_PER_CYCLE = 16;

function drive(): { dcVolts: number; rfVolts: number } {
  const set = setPointOf(500, 0.7, FIELD);
  if (set.kind !== "set-point") throw new Error(set.kind);
  return set;
}
const { dcVolts, rfVolts } = drive();

function deterministic(accuracy: number): Side {
  return {
    label: `polygons, error bound below ${accuracy}`,
    operations: MZ.length,
    run: () => {
      let sum = 0;
      for (const mz of MZ) {
        const flight = { mz, dcVolts, rfVolts, field: FIELD, rfCycles: RF_CYCLES, beam: BEAM, accuracy };
        const answer = transmissionOf(flight);
        if (answer.kind === "transmission") sum += answer.transmission;
      }
      return sum;
    },
  };
}

/** `share`: of one value; an error ten times smaller takes a hundred times the ions, so this run is 0.01 of it. */
function randomIons(share: number): Side {
  const scale = 1 / (FIELD.fieldRadius * Math.PI * FIELD.frequency);
  const beam = { sigmaPosition: BEAM.sigmaX / FIELD.fieldRadius, sigmaVelocity: VELOCITY * scale };
  return {
    label: `Monte Carlo, standard error 1e-3${share === 1 ? "" : ", its time times 100 for 1e-4"}`,
    operations: MZ.length * share,
    run: () => {
      let sum = 0;
      for (const mz of MZ) {
        const a = aOf(mz, dcVolts, FIELD);
        const q = qOf(mz, rfVolts, FIELD);
        const x = { a, q, ...beam };
        const y = { a: -a, q: -q, ...beam };
        sum += monteCarloTransmission(x, y, RF_CYCLES, CHECKS_PER_CYCLE, IONS, 20260);
      }
      return sum * share;
    },
  };
}

const note = `${IONS} ions a value, ${CHECKS_PER_CYCLE} checks a cycle on exact step matrices, lost ions dropped at once`;
/** Three standard errors of the sum over its size. */
const checksumTolerance = 0.03;

function wholePeak(accuracy: number): Side {
  return {
    label: `position, height, widths at 50 % and 10 %, accuracy ${accuracy} of the height`,
    operations: 1,
    run: () => {
      const residence = () => RF_CYCLES;
      const peak = peakProfileOf({ dcVolts, rfVolts, field: FIELD, residence, beam: BEAM, accuracy });
      return peak.kind === "peak" ? peak.halfHeight!.width : 0;
    },
  };
}

export const TRANSMISSION_CASES: readonly BenchCase[] = [
  {
    name: "transmission at 1e-3, 80 RF cycles",
    target: { of: "time", most: 1 },
    unit: "ms",
    a: deterministic(1e-3),
    b: randomIons(1),
    checksumTolerance,
    note,
  },
  {
    name: "transmission at 1e-4, 80 RF cycles: time",
    target: { of: "time", most: 4 },
    unit: "ms",
    a: deterministic(1e-4),
    b: deterministic(1e-5),
    checksumTolerance: 1e-3,
  },
  {
    name: "transmission at 1e-4, 80 RF cycles: against Monte Carlo",
    target: { of: "speed", least: 1000 },
    unit: "ms",
    a: deterministic(1e-4),
    b: randomIons(0.01),
    checksumTolerance,
    note,
  },
  {
    name: "transmission: a whole peak",
    target: null,
    unit: "ms",
    a: wholePeak(1e-3),
    b: wholePeak(1e-4),
    checksumTolerance: 1e-3,
  },
];
