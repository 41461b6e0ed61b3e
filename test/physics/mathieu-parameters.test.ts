import fc from "fast-check";
import { expect, test } from "vitest";
import { APEX_A, APEX_Q } from "../../services/physics/first-region.ts";
import {
  aOf,
  dcVoltsOf,
  fieldRadiusOf,
  frequencyOf,
  mzOf,
  qOf,
  rfVoltsOf,
} from "../../services/physics/mathieu-parameters.ts";
import { expectWithin, relativeError } from "../measured-bound.ts";
import { anyField, anyMz, anyVolts, logUniform } from "./settings.ts";

test("the volts at the apex are those of the published rules", () => {
  // V = 7.219 M f² r0², U = 1.212 M f² r0² (MHz, cm): Dawson 1976, from memory, four digits. The worked volts were
  // recomputed from first principles with the exact constants 7.22172145 and 1.21212049.
  const first = { fieldRadius: 0.00417, frequency: 1e6 };
  expect(rfVoltsOf(1000, APEX_Q, first).toFixed(1)).toBe("1255.8");
  expect(dcVoltsOf(1000, APEX_A, first).toFixed(1)).toBe("210.8");
  const second = { fieldRadius: 0.003175, frequency: 2e6 };
  expect(rfVoltsOf(28, APEX_Q, second).toFixed(1)).toBe("81.5");
  expect(dcVoltsOf(28, APEX_A, second).toFixed(1)).toBe("13.7");
  const unit = { fieldRadius: 0.01, frequency: 1e6 };
  expectWithin(1e-8, [
    { at: "V constant", error: relativeError(rfVoltsOf(1, APEX_Q, unit), 7.22172145) },
    { at: "U constant", error: relativeError(dcVoltsOf(1, APEX_A, unit), 1.21212049) },
  ]);
  expectWithin(1e-3, [
    { at: "V constant, published", error: relativeError(rfVoltsOf(1, APEX_Q, unit), 7.219) },
    { at: "U constant, published", error: relativeError(dcVoltsOf(1, APEX_A, unit), 1.212) },
  ]);
});

test("the mass range rule holds for volts between the poles, and is off by two to ground", () => {
  // M_max = 7e6 V/(f² r0²): Austin, Holme and Leck in Dawson 1976, from memory, one digit.
  const field = { fieldRadius: 0.005, frequency: 1.3e6 };
  const scale = 1 / (0.005 * 0.005 * 1.3e6 * 1.3e6);
  expectWithin(2e-2, [
    { at: "pole to pole", error: relativeError(mzOf(APEX_Q, 1000 / 2, field), 7e6 * 1000 * scale) },
  ]);
  expectWithin(1e-8, [
    { at: "pole to ground", error: relativeError(mzOf(APEX_Q, 1000, field), 1.3847114e7 * 1000 * scale) },
  ]);
});

test("q of an ion guide is the one of the handbook example", () => {
  // m/z 500, 1 MHz, 4.17 mm: 100 V gives q 0.1124, 200 V 0.2249; recomputed from first principles.
  const field = { fieldRadius: 0.00417, frequency: 1e6 };
  expect(qOf(500, 100, field).toFixed(4)).toBe("0.1124");
  expect(qOf(500, 200, field).toFixed(4)).toBe("0.2249");
});

test("every direction undoes the other", () => {
  fc.assert(
    fc.property(anyMz, anyVolts, anyVolts, anyField, (mz, rfVolts, dcVolts, field) => {
      const q = qOf(mz, rfVolts, field);
      const errors = [
        relativeError(mzOf(q, rfVolts, field), mz),
        relativeError(rfVoltsOf(mz, q, field), rfVolts),
        relativeError(dcVoltsOf(mz, aOf(mz, dcVolts, field), field), dcVolts),
        relativeError(frequencyOf(mz, q, rfVolts, field.fieldRadius), field.frequency),
        relativeError(fieldRadiusOf(mz, q, rfVolts, field.frequency), field.fieldRadius),
      ];
      expect(Math.max(...errors)).toBeLessThan(2e-15);
    }),
  );
});

test("a and q stay when m/z, volts, field radius and frequency scale together", () => {
  fc.assert(
    fc.property(
      anyMz,
      anyVolts,
      anyField,
      logUniform(0.1, 10),
      logUniform(0.1, 10),
      logUniform(0.1, 10),
      (mz, volts, field, byMz, byRadius, byFrequency) => {
        const scaled = {
          fieldRadius: field.fieldRadius * byRadius,
          frequency: field.frequency * byFrequency,
        };
        const scaledVolts = volts * byMz * (byRadius * byFrequency) * (byRadius * byFrequency);
        const errors = [
          relativeError(qOf(mz * byMz, scaledVolts, scaled), qOf(mz, volts, field)),
          relativeError(aOf(mz * byMz, scaledVolts, scaled), aOf(mz, volts, field)),
        ];
        expect(Math.max(...errors)).toBeLessThan(4e-15);
      },
    ),
  );
});
