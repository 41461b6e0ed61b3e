import type { ErrorItem } from "../../contract/rule.ts";
import { boundaryArcs } from "../../physics/regions/boundary-arcs.ts";
import { regionsInBox } from "../../physics/regions/regions-in-box.ts";
import type { CharacteristicCurve } from "../../physics/regions/scan-line-crossing.ts";
import type { Corner, StabilityRegion } from "../../physics/regions/stability-regions.ts";
import { stabilityDiagram } from "../diagram/stability-diagram.ts";
import { defineEndpoint } from "../endpoint.ts";
import { regionOf } from "../shapes/region.ts";
import { SOURCES } from "../shapes/sources.ts";
import {
  POINTS_PER_ARC,
  StabilityRegionsAnswer,
  StabilityRegionsQuery,
  WHOLE_BOX,
} from "../shapes/stability-regions.ts";

export const stabilityRegions = defineEndpoint({
  operationId: "stabilityRegions",
  method: "get",
  path: "/v1/stability-regions",
  tag: "Ion motion",
  summary: "Corners and boundary curves of the stability regions; also as a diagram",
  description:
    "The regions of the ideal mass filter under a sinusoid, in a box of (a, q). Region (n_x, n_y) is where a_{n_x}(q) < a < b_{n_x+1}(q) and a_{n_y}(q) < −a < b_{n_y+1}(q). Accept: image/svg+xml answers as a diagram to print.",
  request: StabilityRegionsQuery,
  rules: [
    ({ aMin, aMax }) => inOrder("a", aMin ?? WHOLE_BOX.aMin, aMax ?? WHOLE_BOX.aMax),
    ({ qMin, qMax }) => inOrder("q", qMin ?? WHOLE_BOX.qMin, qMax ?? WHOLE_BOX.qMax),
  ],
  work: null,
  answer: StabilityRegionsAnswer,
  forms: { "image/svg+xml": stabilityDiagram },
  examples: {
    "first-region": {
      summary: "The triangle of the first region, as it is usually drawn",
      source: SOURCES.regions,
      request: { aMin: 0, aMax: 0.25, qMin: 0, qMax: 1, pointsPerArc: 3 },
      answer: {
        box: { aMin: 0, aMax: 0.25, qMin: 0, qMax: 1 },
        regions: [
          {
            region: { x: 0, y: 0, name: "first" },
            corners: {
              inner: { a: 0, q: 0, dcToRfRatio: 0 },
              highTip: { a: 0.23699399311247357, q: 0.7059960697133709, dcToRfRatio: 0.16784370570836984 },
              outer: { a: 0, q: 0.9080463337345775, dcToRfRatio: 0 },
              lowTip: { a: -0.23699399311247357, q: 0.7059960697133709, dcToRfRatio: -0.16784370570836984 },
            },
            arcs: [
              {
                curve: "a = −a_0(q)",
                lostTo: "y",
                characteristicExponent: 0,
                points: [
                  { q: 0, a: 0 },
                  { q: 0.35299803485668546, a: 0.061478179798081165 },
                  { q: 0.7059960697133709, a: 0.23699399311247357 },
                ],
                chordError: 0.015215832198637636,
              },
              {
                curve: "a = b_1(q)",
                lostTo: "x",
                characteristicExponent: 1,
                points: [
                  { q: 0.7059960697133709, a: 0.23699399311247357 },
                  { q: 0.8070212017239742, a: 0.11942392457837922 },
                  { q: 0.9080463337345775, a: 0 },
                ],
                chordError: 0.00023652574651797376,
              },
              {
                curve: "a = −b_1(q)",
                lostTo: "y",
                characteristicExponent: 1,
                points: [
                  { q: 0.9080463337345775, a: 0 },
                  { q: 0.8070212017239742, a: -0.11942392457837922 },
                  { q: 0.7059960697133709, a: -0.23699399311247357 },
                ],
                chordError: 0.00023652574651797376,
              },
              {
                curve: "a = a_0(q)",
                lostTo: "x",
                characteristicExponent: 0,
                points: [
                  { q: 0.7059960697133709, a: -0.23699399311247357 },
                  { q: 0.35299803485668546, a: -0.061478179798081165 },
                  { q: 0, a: 0 },
                ],
                chordError: 0.015215832198637636,
              },
            ],
          },
        ],
        reason: null,
      },
    },
  },
  handler({ aMin, aMax, qMin, qMax, pointsPerArc = POINTS_PER_ARC }) {
    const box = {
      aMin: aMin ?? WHOLE_BOX.aMin,
      aMax: aMax ?? WHOLE_BOX.aMax,
      qMin: qMin ?? WHOLE_BOX.qMin,
      qMax: qMax ?? WHOLE_BOX.qMax,
    };
    const { regions, complete } = regionsInBox(box);
    return {
      box,
      regions: regions.map((region) => bounded(region, pointsPerArc)),
      reason: complete ? null : ("outside-computed-domain" as const),
    };
  },
});

function inOrder(axis: "a" | "q", least: number, most: number): ErrorItem[] {
  if (least < most) return [];
  return [
    {
      pointer: `/${axis}Max`,
      code: "not-above",
      detail: `${axis}Max is ${most}; it must be above ${axis}Min, which is ${least}.`,
    },
  ];
}

function bounded(region: StabilityRegion, pointsPerArc: number): StabilityRegionsAnswer["regions"][number] {
  const { inner, highTip, outer, lowTip } = region;
  return {
    region: regionOf(region.bands),
    corners: {
      inner: cornerOf(inner),
      highTip: cornerOf(highTip),
      outer: cornerOf(outer),
      lowTip: cornerOf(lowTip),
    },
    arcs: boundaryArcs(region, pointsPerArc).map(({ lostTo, curve, points, chordError }) => ({
      curve: nameOf(curve, lostTo),
      lostTo,
      characteristicExponent: curve.order,
      points: points.map(({ q, a }) => ({ q, a })),
      chordError,
    })),
  };
}

function cornerOf({ a, q, ratio }: Corner) {
  return { a, q, dcToRfRatio: ratio };
}

function nameOf({ kind, order }: CharacteristicCurve, plane: "x" | "y"): string {
  return `a = ${plane === "x" ? "" : "−"}${kind}_${order}(q)`;
}
