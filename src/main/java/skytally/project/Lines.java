package skytally.project;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.regex.Pattern;
import skytally.notation.NumberReader;

/** Reads a list typed as text, a thing a line; a line that cannot be read is named by its number. */
public final class Lines {

    private static final int SHOWN = 40;
    private static final Pattern END = Pattern.compile("\\R|;");

    /**
     * A thing and the line it stands on.
     *
     * @param number counted from 1, empty lines too
     */
    public record Line<T>(int number, T thing) {}

    private Lines() {}

    /**
     * The things of a text.
     *
     * @param text its lines end with a line end or a semicolon; empty ones are passed over
     * @param one  reads a line, and refuses it with what to write instead
     * @throws IllegalArgumentException with the line and what is wrong with it
     */
    public static <T> List<Line<T>> read(String text, Function<String, T> one) {
        Bounds.require(text.length(), Bounds.TEXT, "characters of text");
        String[] lines = END.split(text);
        Bounds.require(lines.length, Bounds.LINES, "lines");
        List<Line<T>> things = new ArrayList<>();
        for (int i = 0; i < lines.length; i++) {
            String line = lines[i].strip();
            if (line.isEmpty()) {
                continue;
            }
            try {
                things.add(new Line<>(i + 1, one.apply(line)));
            } catch (IllegalArgumentException refused) {
                String shown = line.length() > SHOWN ? line.substring(0, SHOWN) + "…" : line;
                throw new IllegalArgumentException(
                        "Line " + (i + 1) + ", “" + shown + "”: " + refused.getMessage(), refused);
            }
        }
        return things;
    }

    /** The two numbers of a line, apart by a space or one comma; nothing if it is not two numbers. */
    public static Optional<double[]> twoNumbers(String line) {
        String[] parts = line.split("\\s+");
        if (parts.length == 2 && parts[0].endsWith(",")) {
            parts[0] = parts[0].substring(0, parts[0].length() - 1);
        } else if (parts.length == 1) {
            parts = line.split(",", -1);
        }
        if (parts.length != 2) {
            return Optional.empty();
        }
        Optional<Double> first = number(parts[0]);
        Optional<Double> second = number(parts[1]);
        return first.isEmpty() || second.isEmpty()
                ? Optional.empty()
                : Optional.of(new double[] {first.get(), second.get()});
    }

    private static Optional<Double> number(String typed) {
        return NumberReader.read(typed, false) instanceof NumberReader.Number number
                ? Optional.of(number.value().doubleValue())
                : Optional.empty();
    }
}
