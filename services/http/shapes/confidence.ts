import { quantity } from "../../contract/quantity.ts";

export const Confidence = quantity(
  "Confidence of the two-sided interval, such as 0.95. No default: the laboratory decides.",
  0.5,
  0.9999,
);
