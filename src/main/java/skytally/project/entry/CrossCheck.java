package skytally.project.entry;

/**
 * What other values give for one.
 *
 * @param words   told beside it
 * @param differs whether it disagrees with the value in use
 */
record CrossCheck(String words, boolean differs) {}
