package skytally.citation;

/**
 * One source.
 *
 * @param key       its name in the bibliography, such as {@code crumey-2014}
 * @param reference author, year, title and place, as printed
 * @param standing  how well it stands
 */
public record Citation(String key, String reference, Standing standing) {}
