package skytally.assessment;

/**
 * A light beside a natural one that people know.
 *
 * @param natural   the natural light, as said within a sentence
 * @param times     how many times as much light the figure is
 * @param inMoons   whether it is given in full Moons because no star may be compared: the lamp is no point, or
 *     brighter than the Moon
 */
public record Likeness(String natural, double times, boolean inMoons) {}
