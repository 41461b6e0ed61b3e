// Generated from openapi/openapi.json; `npm run generate` writes it anew.
export const OPERATIONS = {
  /** Whether ions or points (a, q) are stable, and which rods take them if not: `POST /v1/stability` */
  stability: { method: "POST", path: "/v1/stability", takesBody: true },
  /** a and q of an ion, and every quantity that follows from them: `POST /v1/mathieu-parameters` */
  mathieuParameters: { method: "POST", path: "/v1/mathieu-parameters", takesBody: true },
  /** Which ions an RF-only rod set guides, and how firmly: `POST /v1/rf-only` */
  rfOnly: { method: "POST", path: "/v1/rf-only", takesBody: true },
  /** How long ions stay in the field, and the resolution that this allows: `POST /v1/transit` */
  transit: { method: "POST", path: "/v1/transit", takesBody: true },
  /** The m/z that a mass filter lets through: `POST /v1/passband` */
  passband: { method: "POST", path: "/v1/passband", takesBody: true },
  /** The RF and DC that give passbands of wanted position and width: `POST /v1/set-points` */
  setPoints: { method: "POST", path: "/v1/set-points", takesBody: true },
  /** Whether the mass-filter settings of a method can do what it claims, on paper: `POST /v1/sign-off` */
  signOff: { method: "POST", path: "/v1/sign-off", takesBody: true },
  /** Whether a record still holds: unaltered, sealed, and the same found from the same input today: `POST /v1/sign-off/verification` */
  signOffVerification: { method: "POST", path: "/v1/sign-off/verification", takesBody: true },
  /** What a transfer to another instrument, or a revision of method, instrument or criteria, changes: `POST /v1/sign-off/comparison` */
  signOffComparison: { method: "POST", path: "/v1/sign-off/comparison", takesBody: true },
  /** Every check of a sign-off, with its default limits and their basis: `GET /v1/sign-off/checks` */
  signOffChecks: { method: "GET", path: "/v1/sign-off/checks", takesBody: false },
  /** Whether this installation computes as it should, against reference values from elsewhere: `POST /v1/self-check` */
  selfCheck: { method: "POST", path: "/v1/self-check", takesBody: false },
  /** The public keys of seals, the current one first: `GET /.well-known/jwks.json` */
  sealKeys: { method: "GET", path: "/.well-known/jwks.json", takesBody: false },
  /** Version, edition of the constants, limits and cautions: `GET /v1/about` */
  about: { method: "GET", path: "/v1/about", takesBody: false },
  /** Every problem the service answers with, and what to do about it: `GET /problems` */
  problems: { method: "GET", path: "/problems", takesBody: false },
} as const;
