package clipramp.circuit;

/** The trigger device with the resistors at its bases. */
public sealed interface Trigger {
    /** Resistor from base one (or the cathode) to the firing common, ohm. */
    Part baseOne();

    /** The device's profile id or in-place name. */
    String deviceId();

    /**
     * A unijunction transistor.
     *
     * @param device the device
     * @param baseOne R1, base one to common, ohm
     * @param baseTwo R2, base two to the clipped supply, ohm
     */
    record UnijunctionTrigger(Unijunction device, Part baseOne, Part baseTwo) implements Trigger {
        @Override
        public String deviceId() {
            return device.id();
        }
    }

    /**
     * A programmable unijunction transistor; its resistors are named by position.
     *
     * @param device the device
     * @param baseOne cathode resistor to common, ohm
     * @param upper R_A, gate to the clipped supply, ohm
     * @param lower R_B, gate to common, ohm
     */
    record ProgrammableTrigger(ProgrammableUnijunction device, Part baseOne, Part upper, Part lower)
            implements Trigger {
        @Override
        public String deviceId() {
            return device.id();
        }
    }
}
