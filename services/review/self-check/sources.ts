/** Tables that were computed outside this project's code, in another language, by two methods that agree. */
export const COMPUTED_AT_50_DIGITS =
  "computed outside this service with 50 digits or more and a second method, CODATA 2022 constants";
