/** The version of the service and of its contract; a test holds it to package.json. */
export const VERSION = "0.1.0";
