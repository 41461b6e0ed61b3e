import fc from "fast-check";
import { expect, test } from "vitest";
import { addPairs, multiplyPairs } from "../../services/physics/double-double.ts";
import { productError } from "../../services/physics/exact-product.ts";

/** 2^200 times a double of magnitude above 2^-147, exactly. */
function scaled(value: number): bigint {
  let rest = value;
  let doublings = 0n;
  while (!Number.isInteger(rest)) {
    rest *= 2;
    doublings++;
  }
  return BigInt(rest) << (200n - doublings);
}

const ordinary = fc
  .double({ min: -1e6, max: 1e6, noNaN: true })
  .map((value) => (Math.abs(value) < 1e-6 ? value + 1 : value));

test("a product and its rounding error are the exact product", () => {
  fc.assert(
    fc.property(ordinary, ordinary, (x, y) => {
      const product = x * y;
      const exact = (scaled(x) * scaled(y)) >> 200n;
      expect(scaled(product) + scaled(productError(x, y, product))).toBe(exact);
    }),
  );
});

test("sums and products of pairs are right to 1e-30 of the operands", () => {
  const pair = new Float64Array(2);
  const small = 1e-17;
  const magnitude = (value: bigint) => (value < 0n ? -value : value);
  fc.assert(
    fc.property(ordinary, ordinary, ordinary, (x, y, tail) => {
      const xLow = x * small * Math.sign(tail);
      const yLow = y * small * 0.5;
      const exactX = scaled(x) + scaled(xLow);
      const exactY = scaled(y) + scaled(yLow);
      addPairs(x, xLow, y, yLow, pair);
      const sumError = magnitude(scaled(pair[0]!) + scaled(pair[1]!) - exactX - exactY);
      expect(sumError <= (magnitude(exactX) + magnitude(exactY)) / 10n ** 30n).toBe(true);
      multiplyPairs(x, xLow, y, yLow, pair);
      const product = (exactX * exactY) >> 200n;
      const productErrorOf = magnitude(scaled(pair[0]!) + scaled(pair[1]!) - product);
      expect(productErrorOf <= magnitude(product) / 10n ** 30n + 2n).toBe(true);
    }),
  );
});
