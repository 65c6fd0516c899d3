package skytally.spectrum;

/**
 * A kind of light with its typical spectrum, such as a warm white LED or high-pressure sodium.
 *
 * @param id       its name for machines, such as {@code led3000}
 * @param label    its name for people
 * @param spectrum typical of the kind; one lamp may differ, see the guide
 */
public record SpectralClass(String id, String label, Spectrum spectrum) {

    private static final String REFERENCE_PREFIX = "ref_";

    public SpectralClass {
        if (!id.matches("[a-z][a-z0-9_]*")) {
            throw new IllegalArgumentException(
                    "The id of a spectral class is small letters, digits and _, not \"" + id + "\"");
        }
        if (label.isBlank()) {
            throw new IllegalArgumentException("The spectral class " + id + " has no label");
        }
    }

    /** A yardstick (natural sky, Sun, hot star), not a lamp somebody could put up. */
    public boolean isReference() {
        return id.startsWith(REFERENCE_PREFIX);
    }
}
