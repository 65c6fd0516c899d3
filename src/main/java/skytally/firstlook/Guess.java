package skytally.firstlook;

/**
 * What stands in for a blank that was left out.
 *
 * @param blank  which
 * @param likely as one would type it
 * @param low    one end of its range
 * @param high   the other end
 * @param why    the reason, as printed
 */
record Guess(Blank blank, String likely, String low, String high, String why) {

    boolean hasRange() {
        return !low.equals(high);
    }
}
