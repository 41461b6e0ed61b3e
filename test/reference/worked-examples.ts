/*
 * Worked examples of the handbooks, each with its source. "Recomputed" means: from first principles with CODATA 2022
 * constants, outside this project's code, to the digits shown.
 */

/** First-region apex and RF-only limit: Dawson (ed.) 1976; Douglas, Mass Spectrom. Rev. 28 (2009) 937. Four digits. */
export const FIRST_REGION = { apexQ: 0.706, apexA: 0.237, rfOnlyQ: 0.908 };

/**
 * Windows near the apex, recomputed for the rule R = 0.126/(0.16784 − U/V) of Paul, Reinhard and von Zahn, Z. Phys. 152
 * (1958) 143, and Dawson 1976.
 */
export const NEAR_APEX = [
  { ratio: 0.16532371, resolution: 49.9, decimals: 1, qLow: 0.694335, qHigh: 0.708392 },
  { ratio: 0.16721371, resolution: 200.4, decimals: 1 },
  { ratio: 0.16771771, resolution: 1003, decimals: 0 },
] as const;

/**
 * Second region at a = 0 and its apex: Dawson and Bingqi, Int. J. Mass Spectrom. Ion Processes 56 (1984) 25; Ying and
 * Douglas, Rapid Commun. Mass Spectrom. 10 (1996) 649. Third region: Du, Olney and Douglas, J. Am. Soc. Mass Spectrom. 8
 * (1997) 1230. Recomputed to these digits.
 */
export const SECOND_REGION = {
  apexQ: 7.54727,
  apexA: 0.02955,
  qLow: 7.51361,
  qHigh: 7.5797,
  resolution: 114,
};
export const THIRD_REGION_CORNERS = [
  { a: 3.1643, q: 3.23408, x: "b_2", y: "a_0" },
  { a: 2.521, q: 2.8153, x: "a_1", y: "b_1" },
] as const;

/** m/z 500, 1 MHz, 0.20 m, 2 eV: Austin, Holme and Leck in Dawson 1976 for the two constants; numbers recomputed. */
export const TRANSIT = {
  mz: 500,
  frequency: 1e6,
  rodLength: 0.2,
  axialEnergyVolts: 2,
  flightTime_us: 227.6,
  resolutions: [4230, 2591],
};

/** An ion guide, m/z 500, 1 MHz, r0 4.17 mm: Gerlich, Adv. Chem. Phys. 82 (1992) 1 for the formula; recomputed. */
export const ION_GUIDE = [
  { volts: 100, q: 0.1124, depth: 2.81, cutoff: 61.9 },
  { volts: 200, q: 0.2249, depth: 11.24, cutoff: 123.8 },
] as const;

/** m/z 1000, width 0.70 between the edges: effects of a hundred ppm, recomputed. */
export const DRIFT_AT_1000 = {
  common: 0.1,
  widthPerRatio_ppm: 0.00133,
  voltsAloneShift: 0.144,
  voltsAloneWidth: 0.83,
};
