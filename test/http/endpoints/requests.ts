/** Parts of requests that the tests of several endpoints share. */
const zeroToPeakToGround = { as: "zero-to-peak", between: "pole-and-ground" } as const;
export const toGround = { rf: zeroToPeakToGround, dc: { between: "pole-and-ground" } } as const;

export function rodSet(fieldRadius_mm: number, frequency_MHz: number, more: object = {}) {
  return { fieldRadius_mm, frequency_MHz, ...more };
}

/** A drive by V zero-to-peak and U, both pole-to-ground. */
export function drive(rfVolts: number, dcVolts?: number) {
  return {
    rf: { volts: rfVolts, ...zeroToPeakToGround },
    ...(dcVolts === undefined ? null : { dc: { volts: dcVolts, between: "pole-and-ground" } }),
  };
}

export function wave(dutyCycle: number, coupling = "dc") {
  return { shape: "rectangular", dutyCycle, coupling };
}

/** The same drive, stated in every other way. */
export function otherStatementsOf(rfVolts: number, dcVolts: number) {
  const byRf = [
    { volts: rfVolts * 2, as: "peak-to-peak", between: "pole-and-ground" },
    { volts: rfVolts * 2, as: "zero-to-peak", between: "pole-and-pole" },
    { volts: rfVolts * 4, as: "peak-to-peak", between: "pole-and-pole" },
    { volts: rfVolts / Math.SQRT2, as: "rms", between: "pole-and-ground" },
    { volts: rfVolts * Math.SQRT2, as: "rms", between: "pole-and-pole" },
  ].map((rf) => ({ rf, dc: { volts: dcVolts, between: "pole-and-ground" } }));
  const byDc = [
    { volts: dcVolts * 2, between: "pole-and-pole" },
    { volts: -dcVolts, between: "pole-and-ground" },
    { pairX_V: dcVolts + 7, pairY_V: -dcVolts + 7 },
    { pairX_V: -dcVolts, pairY_V: dcVolts },
  ].map((dc) => ({ rf: { volts: rfVolts, ...zeroToPeakToGround }, dc }));
  return [...byRf, ...byDc];
}

/** 1,000 items is the most that one request may hold. */
export function many<Item>(count: number, item: Item): Item[] {
  return Array.from({ length: count }, () => item);
}
