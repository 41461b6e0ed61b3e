/**
 * The cautions that stand wherever these numbers could hurt someone: README, root page, sign-off report and the
 * description of the OpenAPI document show all of them, in this order.
 */
export const CAUTIONS: readonly string[] = [
  "Paper checks only: nothing here is an instruction to open, energise, tune or bypass equipment.",
  "RF and DC supplies reach kilovolts and charge remains after switch-off. Never defeat an interlock; only authorised service staff work on them, under the local electrical code.",
  "Calculated volts are not settings to apply, and they may exceed what any supply or insulation can bear. A headroom pass says nothing about insulation or corona.",
  "Detectors, ion sources and torches carry high voltage too, RF burns, parts are hot and evacuated vessels can implode. Gases can asphyxiate, burn, corrode or poison: follow the site's rules.",
  "A result is not a validation, a diagnosis or a measurement. It replaces no tune check, no system suitability test and no interference study.",
  "The laboratory validates this service for its own use, and its responsible signatory decides.",
  "A pass covers neither the chemistry in the collision cell nor ions that the method does not list.",
  "The model is an ideal hyperbolic field without collisions, space charge, rod errors or peak tails, unless an answer says otherwise.",
];
