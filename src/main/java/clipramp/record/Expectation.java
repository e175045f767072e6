package clipramp.record;

/**
 * One line of the commissioning sheet.
 *
 * @param where test point or place
 * @param what what is measured, and at which knob position
 * @param expected nominal value with its unit
 * @param tolerance how far a good unit may be off, with unit; empty where it is not computed
 * @param instrument what is fit to measure it
 */
record Expectation(String where, String what, String expected, String tolerance, String instrument) {}
