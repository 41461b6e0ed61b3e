// Generated from openapi/openapi.json; `npm run generate` writes it anew.
export const OPERATIONS = {
  /** Whether ions or points (a, q) are stable, and which rods take them if not: `POST /v1/stability` */
  stability: { method: "POST", path: "/v1/stability", takes: "body" },
  /** Corners and boundary curves of the stability regions; also as a diagram: `GET /v1/stability-regions` */
  stabilityRegions: { method: "GET", path: "/v1/stability-regions", takes: "query" },
  /** a and q of an ion, and every quantity that follows from them: `POST /v1/mathieu-parameters` */
  mathieuParameters: { method: "POST", path: "/v1/mathieu-parameters", takes: "body" },
  /** Which ions an RF-only rod set guides, and how firmly: `POST /v1/rf-only` */
  rfOnly: { method: "POST", path: "/v1/rf-only", takes: "body" },
  /** How long ions stay in the field, and the resolution that this allows: `POST /v1/transit` */
  transit: { method: "POST", path: "/v1/transit", takes: "body" },
  /** The path of one ion, where and when it is lost, and what stands on the rods: `POST /v1/trajectory` */
  trajectory: { method: "POST", path: "/v1/trajectory", takes: "body" },
  /** The m/z that a mass filter lets through: `POST /v1/passband` */
  passband: { method: "POST", path: "/v1/passband", takes: "body" },
  /** The RF and DC, or the frequency, that give passbands of wanted position and width: `POST /v1/set-points` */
  setPoints: { method: "POST", path: "/v1/set-points", takes: "body" },
  /** The share of a beam that passes against m/z, and position, height and widths of the peak: `POST /v1/peak-profile` */
  peakProfile: { method: "POST", path: "/v1/peak-profile", takes: "body" },
  /** Set points over a range, the straight line in their place, and the fastest scan: `POST /v1/scan-table` */
  scanTable: { method: "POST", path: "/v1/scan-table", takes: "body" },
  /** What tolerances do to a window, what they may be, and when to tune again: `POST /v1/drift-budget` */
  driftBudget: { method: "POST", path: "/v1/drift-budget", takes: "body" },
  /** Position and width of measured peaks as a line, what each peak pulls, and what to expect between: `POST /v1/mz-calibration` */
  mzCalibration: { method: "POST", path: "/v1/mz-calibration", takes: "body" },
  /** Whether the mass-filter settings of a method can do what it claims, on paper: `POST /v1/sign-off` */
  signOff: { method: "POST", path: "/v1/sign-off", takes: "body" },
  /** Whether a record still holds: unaltered, sealed, and the same found from the same input today: `POST /v1/sign-off/verification` */
  signOffVerification: { method: "POST", path: "/v1/sign-off/verification", takes: "body" },
  /** What a transfer to another instrument, or a revision of method, instrument or criteria, changes: `POST /v1/sign-off/comparison` */
  signOffComparison: { method: "POST", path: "/v1/sign-off/comparison", takes: "body" },
  /** Every check of a sign-off, with its default limits and their basis: `GET /v1/sign-off/checks` */
  signOffChecks: { method: "GET", path: "/v1/sign-off/checks", takes: "nothing" },
  /** Whether this installation computes as it should, against reference values from elsewhere: `POST /v1/self-check` */
  selfCheck: { method: "POST", path: "/v1/self-check", takes: "nothing" },
  /** The public keys of seals, the current one first: `GET /.well-known/jwks.json` */
  sealKeys: { method: "GET", path: "/.well-known/jwks.json", takes: "nothing" },
  /** Version, edition of the constants, limits and cautions: `GET /v1/about` */
  about: { method: "GET", path: "/v1/about", takes: "nothing" },
  /** Every problem the service answers with, and what to do about it: `GET /problems` */
  problems: { method: "GET", path: "/problems", takes: "nothing" },
} as const;
