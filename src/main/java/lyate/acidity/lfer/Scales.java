package lyate.acidity.lfer;

/** How large a step of a descriptor is typical, so that steps of different descriptors can be compared. */
public final class Scales {

    private Scales() {}

    /** The typical step of a descriptor, by the last word of its name. */
    public static double of(String descriptor) {
        return switch (descriptor.substring(descriptor.lastIndexOf('.') + 1)) {
            case "induction", "pairs" -> 0.25;
            case "resonance", "acceptance" -> 0.3;
            case "donation" -> 0.4;
            case "bulk", "second-shell" -> 2;
            case "third-shell" -> 3;
            case "fourth-shell" -> 4;
            default -> 1;
        };
    }
}
