import type { z } from "zod";
import type { Example } from "../endpoint.ts";
import type { PeakProfileAnswer, PeakProfileRequest } from "../shapes/peak-profile.ts";

type Examples = Readonly<
  Record<string, Example<z.input<typeof PeakProfileRequest>, z.output<typeof PeakProfileAnswer>>>
>;

export const PEAK_PROFILE_EXAMPLES: Examples = {
  "inside-a-window": {
    summary: "A window of 0.70 at m/z 500 with 80 RF cycles: three points, position, height and widths",
    source:
      "Within the stated error bound of an independent polygon integral, which gives 0.00590255655, 0.0749850046 and 0.0548484367 (test/reference, transmission_public, setting p1).",
    request: {
      rodSet: {
        fieldRadius_mm: 4,
        frequency_MHz: 1.2,
      },
      drive: {
        rf: {
          volts: 831.55739482,
          as: "zero-to-peak",
          between: "pole-and-ground",
        },
        dc: {
          volts: 139.42457479,
          between: "pole-and-ground",
        },
      },
      residence: {
        rfCycles: 80,
      },
      beam: {
        sigmaX_mm: 0.4,
        sigmaY_mm: 0.4,
        sigmaVx_mPerS: 138.914,
        sigmaVy_mPerS: 138.914,
      },
      mz: {
        values: [499.4844, 500, 500.2344],
      },
      accuracy: 0.0001,
    },
    answer: {
      points: [
        {
          mz: 499.4844,
          transmission: 0.005902255487915807,
          reason: null,
        },
        {
          mz: 500,
          transmission: 0.0749850039071937,
          reason: null,
        },
        {
          mz: 500.2344,
          transmission: 0.054848436252830264,
          reason: null,
        },
      ],
      method: {
        phases: 64,
        samplesPerCycle: 1024,
        errorBound: 0.00006880164782818814,
      },
      peak: {
        mz: 499.98481439736855,
        transmission: 0.07505004020722664,
        widthHalfHeight: 0.6188508901663567,
        widthTenthHeight: 1.1871607365861223,
        halfHeight: {
          mzLow: 499.6913377702935,
          mzHigh: 500.31018866045986,
          shiftFromCentre: 0.0007632188123807282,
        },
        tenthHeight: {
          mzLow: 499.51876897898745,
          mzHigh: 500.7059297155736,
          shiftFromCentre: 0.11234935071627206,
        },
        edges: {
          mzLow: 499.65000000517057,
          mzHigh: 500.349999987958,
          mzCentre: 499.99999999656427,
          width: 0.6999999827874375,
        },
        shiftFromCentre: -0.015185599195717714,
        errorBound: 0.000006877580507450535,
      },
      peakReason: null,
    },
  },
  "while-scanning": {
    summary: "The same window moved at 1000 m/z per s, with energies for residence and beam",
    request: {
      rodSet: {
        fieldRadius_mm: 4,
        frequency_MHz: 1.2,
        rodLength_mm: 200,
      },
      drive: {
        rf: {
          volts: 831.55739482,
          as: "zero-to-peak",
          between: "pole-and-ground",
        },
        dc: {
          volts: 139.42457479,
          between: "pole-and-ground",
        },
      },
      residence: {
        axialEnergy_eVPerCharge: 4,
      },
      beam: {
        sigma_mm: 0.4,
        meanRadialEnergy_eVPerCharge: 0.1,
      },
      mz: {
        from: 499.5,
        to: 500.5,
        points: 3,
      },
      scanRate_mzPerS: 1000,
    },
    answer: {
      points: [
        {
          mz: 499.5,
          transmission: 0.00001449682733924477,
          reason: null,
        },
        {
          mz: 500,
          transmission: 0.0706212706949648,
          reason: null,
        },
        {
          mz: 500.5,
          transmission: 0.002463913744363226,
          reason: null,
        },
      ],
      method: {
        phases: 64,
        samplesPerCycle: 256,
        errorBound: 0.000524770181200215,
      },
      peak: {
        mz: 500.00868462828345,
        transmission: 0.07090053926259808,
        widthHalfHeight: 0.6077364669909571,
        widthTenthHeight: 0.7326983866412888,
        halfHeight: {
          mzLow: 499.7377367545342,
          mzHigh: 500.34547322152514,
          shiftFromCentre: 0.041604991465419516,
        },
        tenthHeight: {
          mzLow: 499.72015449315484,
          mzHigh: 500.4528528797961,
          shiftFromCentre: 0.08650368991118285,
        },
        edges: {
          mzLow: 499.65000000517057,
          mzHigh: 500.349999987958,
          mzCentre: 499.99999999656427,
          width: 0.6999999827874375,
        },
        shiftFromCentre: 0.008684631719177105,
        errorBound: 0.000034505119434936085,
      },
      peakReason: null,
    },
  },
  "without-dc": {
    summary: "RF-only rods: values, and why there is no peak",
    request: {
      rodSet: {
        fieldRadius_mm: 4,
        frequency_MHz: 1.2,
      },
      drive: {
        rf: {
          volts: 831.55739482,
          as: "zero-to-peak",
          between: "pole-and-ground",
        },
      },
      residence: {
        rfCycles: 80,
      },
      beam: {
        sigma_mm: 0.4,
        meanRadialEnergy_eVPerCharge: 0.1,
      },
      mz: {
        values: [1, 400, 600],
      },
    },
    answer: {
      points: [
        {
          mz: 1,
          transmission: null,
          reason: "outside-computed-domain",
        },
        {
          mz: 400,
          transmission: 0.6419744204870071,
          reason: null,
        },
        {
          mz: 600,
          transmission: 0.9997761760528154,
          reason: null,
        },
      ],
      method: {
        phases: 64,
        samplesPerCycle: 256,
        errorBound: 0.0005170363418461346,
      },
      peak: null,
      peakReason: "no-upper-edge",
    },
  },
};
