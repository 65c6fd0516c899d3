package skytally.skyglow;

/** How finely tests work where the fineness is not what they look at. */
final class TestResolutions {

    /** A thirtieth of the usual work. */
    static final Resolution COARSE = new Resolution(
            16,
            7,
            4,
            new DirectionRule.Density(8, 4, 2, 4),
            8,
            5,
            new AngularBasis(10, 2),
            new DirectionRule.Density(6, 3, 2, 3),
            5,
            3,
            new AngularBasis(6, 1));

    /** Hardly anything: where only the form of a kernel counts. */
    static final Resolution TINY = new Resolution(
            5,
            3,
            2,
            new DirectionRule.Density(2, 1, 1, 1),
            2,
            2,
            new AngularBasis(2, 0),
            new DirectionRule.Density(2, 1, 1, 1),
            2,
            2,
            new AngularBasis(2, 0));

    private TestResolutions() {}
}
