package skytally.skyglow;

/**
 * How finely the sky of all orders is worked out. The effort grows with every number.
 *
 * @param distances   rows of the grid
 * @param levels      points of each row
 * @param orders      how often light is followed from scattering to scattering; what is left is guessed from how the
 *                    last orders fell
 * @param first       directions summed for light scattered once
 * @param firstLow    points on a line through the low air, for the same
 * @param firstHigh   points on a line above it
 * @param firstBasis  functions of direction kept for the same
 * @param later       directions summed for the orders above
 * @param laterLow    points on a line through the low air, for the same
 * @param laterHigh   points on a line above it
 * @param laterBasis  functions of direction kept for the same
 */
record Resolution(
        int distances,
        int levels,
        int orders,
        DirectionRule.Density first,
        int firstLow,
        int firstHigh,
        AngularBasis firstBasis,
        DirectionRule.Density later,
        int laterLow,
        int laterHigh,
        AngularBasis laterBasis) {

    /**
     * Against one with twelve times the work, 0.5 to 100 km away and down to 5° above the horizon: half of all directions
     * within 0.3 %, nineteen in twenty within 2 %, all within 4 %, the worst 75 to 100 km away in haze.
     */
    static final Resolution USUAL = new Resolution(
            30,
            14,
            6,
            new DirectionRule.Density(16, 12, 4, 10),
            20,
            12,
            new AngularBasis(16, 4),
            new DirectionRule.Density(16, 5, 3, 5),
            10,
            6,
            new AngularBasis(12, 3));

    Resolution withOrders(int count) {
        return new Resolution(
                distances,
                levels,
                count,
                first,
                firstLow,
                firstHigh,
                firstBasis,
                later,
                laterLow,
                laterHigh,
                laterBasis);
    }
}
