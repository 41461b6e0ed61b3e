import { CONSTANTS_EDITION } from "../physics/constants.ts";
import type { Engine } from "../review/record/record-schema.ts";
import { VERSION } from "./version.ts";

/** What computes here, as records name it. */
export const ENGINE: Engine = { version: VERSION, constants: CONSTANTS_EDITION };
