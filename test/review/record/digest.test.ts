import { expect, test } from "vitest";
import { canonicalJson, digestOf } from "../../../services/review/record/digest.ts";

/** RFC 8785, appendix B: the bits of a double and its text. */
const NUMBERS: readonly [bits: string, text: string][] = [
  ["0000000000000000", "0"],
  ["8000000000000000", "0"],
  ["0000000000000001", "5e-324"],
  ["8000000000000001", "-5e-324"],
  ["7fefffffffffffff", "1.7976931348623157e+308"],
  ["ffefffffffffffff", "-1.7976931348623157e+308"],
  ["4340000000000000", "9007199254740992"],
  ["c340000000000000", "-9007199254740992"],
  ["4430000000000000", "295147905179352830000"],
  ["44b52d02c7e14af5", "9.999999999999997e+22"],
  ["44b52d02c7e14af6", "1e+23"],
  ["44b52d02c7e14af7", "1.0000000000000001e+23"],
  ["444b1ae4d6e2ef4e", "999999999999999700000"],
  ["444b1ae4d6e2ef4f", "999999999999999900000"],
  ["444b1ae4d6e2ef50", "1e+21"],
  ["3eb0c6f7a0b5ed8c", "9.999999999999997e-7"],
  ["3eb0c6f7a0b5ed8d", "0.000001"],
  ["41b3de4355555553", "333333333.3333332"],
  ["41b3de4355555554", "333333333.33333325"],
  ["41b3de4355555555", "333333333.3333333"],
  ["41b3de4355555556", "333333333.3333334"],
  ["41b3de4355555557", "333333333.33333343"],
  ["becbf647612f3696", "-0.0000033333333333333333"],
  ["43143ff3c1cb0959", "1424953923781206.2"],
];

const double = (bits: string) => Buffer.from(bits, "hex").readDoubleBE();

test.each(NUMBERS)("the double %s is written as RFC 8785, appendix B, writes it: %s", (bits, text) => {
  expect(canonicalJson(double(bits))).toBe(text);
});

test.each(["7fffffffffffffff", "7ff0000000000000"])("the double %s has no canonical text", (bits) => {
  expect(() => canonicalJson(double(bits))).toThrow();
});

test("the example of RFC 8785, section 3.2.2, comes out as the bytes of section 3.2.4", () => {
  const document = String.raw`{
    "numbers": [333333333.33333329, 1E30, 4.50, 2e-3, 0.000000000000000000000000001],
    "string": "\u20ac$\u000F\u000aA'\u0042\u0022\u005c\\\"\/",
    "literals": [null, true, false]
  }`;
  const bytes =
    "7b226c69746572616c73223a5b6e756c6c2c747275652c66616c73655d2c226e756d62657273223a5b3333333333333333332e33" +
    "3333333333332c31652b33302c342e352c302e3030322c31652d32375d2c22737472696e67223a22e282ac245c75303030665c6e" +
    "4127425c225c5c5c5c5c222f227d";
  expect(Buffer.from(canonicalJson(JSON.parse(document))).toString("hex")).toBe(bytes);
});

test("members are sorted by UTF-16 code units, as in RFC 8785, section 3.2.3", () => {
  const document = String.raw`{
    "\u20ac": "Euro Sign", "\r": "Carriage Return", "\ufb33": "Hebrew Letter Dalet With Dagesh", "1": "One",
    "\ud83d\ude00": "Emoji: Grinning Face", "\u0080": "Control", "\u00f6": "Latin Small Letter O With Diaeresis"
  }`;
  expect(Object.values(JSON.parse(canonicalJson(JSON.parse(document))))).toHaveLength(7);
  expect([...canonicalJson(JSON.parse(document)).matchAll(/:"([^"]+)"/g)].map(([, name]) => name)).toEqual([
    "Carriage Return",
    "One",
    "Control",
    "Latin Small Letter O With Diaeresis",
    "Euro Sign",
    "Emoji: Grinning Face",
    "Hebrew Letter Dalet With Dagesh",
  ]);
});

test("the digest is the SHA-256 of the UTF-8 bytes", () => {
  // printf '"abc"' | sha256sum, GNU coreutils; the same for printf '{"é":1}'.
  expect(digestOf("abc")).toBe("6cc43f858fbb763301637b5af970e2a46b46f461f27e5a0f41e009c59b827b25");
  expect(digestOf({ é: 1 })).toBe("ddcfcf4765da163969972bb20660092ca2787782d9352d1d8a38e93f70acf3bf");
});

test("half a character has no canonical text", () => {
  expect(() => digestOf({ id: "\ud800" })).toThrow();
});
