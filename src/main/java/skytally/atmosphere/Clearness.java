package skytally.atmosphere;

import java.util.Arrays;
import java.util.Optional;

/** The air in four plain words, each an aerosol optical depth at 550 nm (from memory). */
public enum Clearness {
    VERY_CLEAR("very-clear", "very clear", 0.05),
    CLEAR("clear", "clear", 0.10),
    AVERAGE("average", "average", 0.20),
    HAZY("hazy", "hazy", 0.30);

    private final String id;
    private final String words;
    private final double aerosolDepthAt550;

    Clearness(String id, String words, double aerosolDepthAt550) {
        this.id = id;
        this.words = words;
        this.aerosolDepthAt550 = aerosolDepthAt550;
    }

    public static Optional<Clearness> byId(String id) {
        return Arrays.stream(values()).filter(air -> air.id.equals(id)).findFirst();
    }

    public String id() {
        return id;
    }

    public String words() {
        return words;
    }

    public double aerosolDepthAt550() {
        return aerosolDepthAt550;
    }
}
