/** Where the numbers of examples come from when a program other than this one computed them. */
export const SOURCES = {
  stability:
    "Computed at 75 digits by an independent program and checked by numerical integration (test/reference, stability of points).",
  regions:
    "Corners computed at 50 digits from the characteristic curves by an independent program (test/reference, stability regions).",
  passbands:
    "Computed at 50 digits by an independent program and checked by numerical integration (test/reference, passbands).",
  rectangularWaves:
    "Edges computed at 50 digits from products of exact matrices by an independent program (test/reference, rectangular waves among the passbands).",
  rfOnly: "Computed at 50 digits by an independent program (test/reference, rods without DC).",
  peakShapes: "Computed by an independent program, printed to 12 digits (test/reference, peak shapes).",
} as const;
