// Generated from openapi/openapi.json; `npm run generate` writes it anew.
export const OPERATIONS = {
  stability: { method: "POST", path: "/v1/stability", takesBody: true },
  mathieuParameters: { method: "POST", path: "/v1/mathieu-parameters", takesBody: true },
  rfOnly: { method: "POST", path: "/v1/rf-only", takesBody: true },
  transit: { method: "POST", path: "/v1/transit", takesBody: true },
  passband: { method: "POST", path: "/v1/passband", takesBody: true },
  setPoints: { method: "POST", path: "/v1/set-points", takesBody: true },
  signOff: { method: "POST", path: "/v1/sign-off", takesBody: true },
  signOffChecks: { method: "GET", path: "/v1/sign-off/checks", takesBody: false },
  about: { method: "GET", path: "/v1/about", takesBody: false },
  problems: { method: "GET", path: "/problems", takesBody: false },
} as const;
