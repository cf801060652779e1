package twofold.layout;

/**
 * A number of the plan and which of several values it is set to: numbers that share a value are set together.
 *
 * @param target what is set
 * @param number index of its value
 */
record Knob(Target target, int number) {}
