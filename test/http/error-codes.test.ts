import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import { ERROR_CODES, type ErrorCode } from "../../services/http/error-codes.ts";
import { SIGN_OFF_EXAMPLE } from "../../services/http/examples/sign-off.ts";
import { errorsOf } from "./test-app.ts";

const rodSet = { fieldRadius_mm: 4, frequency_MHz: 1.2, rodLength_mm: 200 };
const rf = { volts: 831.5, as: "zero-to-peak", between: "pole-and-ground" };
const dc = { volts: 139.4, between: "pole-and-ground" };
const ofIons = { given: "ions", rodSet, drive: { rf, dc }, ions: [{ mz: 500 }] };
const transit = { rodSet, residence: { rfCycles: 200 }, ions: [{ mz: 500 }] };
const setPoint = {
  rodSet,
  convention: {
    rf: { as: "zero-to-peak", between: "pole-and-ground" },
    dc: { between: "pole-and-ground" },
  },
  targets: [{ ion: { mz: 500 }, width: { value: 0.7, as: "mz", at: "edges" } }],
};
const rectangular = { shape: "rectangular", dutyCycle: 0.5, coupling: "dc" };

/** The example of a sign-off with one member changed. */
function signOffWith(change: (request: Changeable) => void): unknown {
  const request = structuredClone(SIGN_OFF_EXAMPLE) as unknown as Changeable;
  change(request);
  return request;
}
// biome-ignore lint/suspicious/noExplicitAny: a request is changed here in ways that its type forbids.
type Changeable = any;

/** At least one request for every code of the registry, with the member that is wrong. */
const REQUESTS: Record<ErrorCode, [path: string, body: unknown, pointer: string]> = {
  "unknown-member": ["/v1/stability", { ...ofIons, ion: 1 }, "/ion"],
  "missing-member": [
    "/v1/transit",
    {
      ...transit,
      rodSet: { fieldRadius_mm: 4, frequency_MHz: 1 },
      residence: { axialEnergy_eVPerCharge: 1 },
    },
    "/rodSet/rodLength_mm",
  ],
  "wrong-type": ["/v1/stability", { ...ofIons, ions: [{ mz: "500" }] }, "/ions/0/mz"],
  "not-whole": ["/v1/stability", { ...ofIons, ions: [{ mz: 500, charge: 1.5 }] }, "/ions/0/charge"],
  "out-of-range": ["/v1/stability", { ...ofIons, ions: [{ mz: 0.4 }] }, "/ions/0/mz"],
  "not-one-of": ["/v1/stability", { ...ofIons, given: "masses" }, "/given"],
  "wrong-length": [
    "/v1/stability",
    { ...ofIons, ions: [{ mz: 500, label: "x".repeat(201) }] },
    "/ions/0/label",
  ],
  "wrong-count": ["/v1/stability", { ...ofIons, ions: [] }, "/ions"],
  "wrong-format": ["/v1/stability", { ...ofIons, ions: [{ mz: 500, label: "a\u0007" }] }, "/ions/0/label"],
  "duplicate-member": [
    "/v1/sign-off",
    JSON.stringify(SIGN_OFF_EXAMPLE).replace('"polarity":', '"polarity":"negative","polarity":'),
    "/method/polarity",
  ],
  "too-deep": [
    "/v1/sign-off/verification",
    `{"record":${'{"result":'.repeat(41)}1${"}".repeat(41)}}`,
    `/record${"/result".repeat(40)}`,
  ],
  "not-unique": [
    "/v1/sign-off",
    signOffWith(({ method }) => method.acquisition.push(method.acquisition[0])),
    "/method/acquisition/1/id",
  ],
  "not-found": [
    "/v1/sign-off",
    signOffWith(({ method }) => {
      method.compounds = [];
      method.acquisition[0].compound = "SMX";
    }),
    "/method/acquisition/0/compound",
  ],
  "not-above": [
    "/v1/sign-off",
    signOffWith(({ method }) =>
      Object.assign(method.acquisition[0], { retention: { start_min: 2, end_min: 1 } }),
    ),
    "/method/acquisition/0/retention/end_min",
  ],
  "not-below": [
    "/v1/sign-off",
    signOffWith(({ method }) => {
      method.acquisition = [
        { id: "NL", kind: "neutral-loss-scan", lossMz: 60, mzFrom: 50, mzTo: 100, rate_mzPerS: 1000 },
      ];
    }),
    "/method/acquisition/0/lossMz",
  ],
  "charge-is-zero": ["/v1/stability", { ...ofIons, ions: [{ mz: 500, charge: 0 }] }, "/ions/0/charge"],
  "charge-against-polarity": [
    "/v1/sign-off",
    signOffWith(({ method }) => {
      method.polarity = "positive";
      method.acquisition[0].precursor.charge = -1;
    }),
    "/method/acquisition/0/precursor/charge",
  ],
  "limits-crossed": [
    "/v1/sign-off",
    signOffWith((request) => {
      request.criteria = {
        id: "C",
        revision: "1",
        checks: { "rf-cycles": { pass: { min: 12 }, caution: { min: 20 } } },
      };
    }),
    "/criteria/checks/rf-cycles/caution",
  ],
  "stages-do-not-fit": [
    "/v1/sign-off",
    signOffWith(({ instrument }) => {
      instrument.stages = instrument.stages.filter(({ role }: { role: string }) => role !== "collision-cell");
    }),
    "/method/acquisition/0/kind",
  ],
  "needs-two-pole-pairs": [
    "/v1/passband",
    { rodSet: { ...rodSet, polePairs: 4 }, drive: { rf, dc } },
    "/rodSet/polePairs",
  ],
  "member-not-taken": ["/v1/set-points", { ...setPoint, rf }, "/rf"],
  "dc-not-taken": ["/v1/rf-only", { rodSet, drive: { rf, dc }, ions: [{ mz: 500 }] }, "/drive/dc"],
  "ion-trap-not-computed": [
    "/v1/sign-off",
    signOffWith(({ instrument }) => instrument.stages.push({ name: "T", role: "ion-trap" })),
    "",
  ],
  "formula-not-computed": [
    "/v1/stability",
    { ...ofIons, ions: [{ formula: "C33H40N2O9", adduct: "[M+H]+" }] },
    "/ions/0/formula",
  ],
  "waveform-not-computed": [
    "/v1/rf-only",
    { rodSet: { ...rodSet, waveform: rectangular }, drive: { rf }, ions: [{ mz: 500 }] },
    "/rodSet/waveform",
  ],
  "region-not-computed": [
    "/v1/set-points",
    { ...setPoint, rodSet: { ...rodSet, waveform: rectangular }, region: "third" },
    "/region",
  ],
};

describe("the registry of errors", () => {
  it.each(Object.entries(REQUESTS))("is answered from: %s", async (code, [path, body, pointer]) => {
    const errors = await errorsOf(path, body);
    const found = errors.filter((error) => error[1] === code);
    expect(found.length, JSON.stringify(errors)).toBeGreaterThan(0);
    if (pointer !== "") expect(found).toContainEqual([pointer, code]);
  });

  it("has every code that a rule gives", () => {
    const codes = ["services/contract", "services/review", "services/http"]
      .flatMap(sources)
      .flatMap((file) =>
        [...readFileSync(file, "utf8").matchAll(/pointer.*?code: "([a-z-]+)"/gs)].map(([, code]) => code),
      );
    expect(codes).toContain("formula-not-computed");
    expect(codes.filter((code) => !Object.hasOwn(ERROR_CODES, code!))).toEqual([]);
  });
});

function sources(folder: string): string[] {
  return readdirSync(folder, { recursive: true, encoding: "utf8" })
    .filter((name) => name.endsWith(".ts"))
    .map((name) => join(folder, name));
}
