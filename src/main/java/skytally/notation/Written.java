package skytally.notation;

/**
 * A number written out: digits, and a power of ten when the digits alone would need too many noughts.
 *
 * <p>Pages set the power as a raised figure; plain text uses {@link #plain()}.
 *
 * @param digits such as {@code 0.00033}, {@code 5 200} or {@code −5.3}; with no-break spaces and a true minus
 * @param power  of ten that multiplies the digits; 0 when there is none
 */
public record Written(String digits, int power) {

    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    public boolean hasPower() {
        return power != 0;
    }

    /** The power with a true minus, as set in a raised figure. */
    public String powerDigits() {
        return power < 0 ? "−" + (-power) : Integer.toString(power);
    }

    /** All in one line of text, such as {@code 1.4 × 10⁻⁵}, that no line break divides. */
    public String plain() {
        if (!hasPower()) {
            return digits;
        }
        StringBuilder text = new StringBuilder(digits).append("\u00a0×\u00a010");
        if (power < 0) {
            text.append('⁻');
        }
        Integer.toString(Math.abs(power)).chars().forEach(digit -> text.append(RAISED.charAt(digit - '0')));
        return text.toString();
    }

    @Override
    public String toString() {
        return plain();
    }
}
