package skytally.project.shelf;

import java.util.List;

/**
 * Every page of a project, by its address after the project's own; Seen and Sky glow have a test of their own. A new page
 * is one line here.
 */
public final class ProjectPages {

    /** With marks that the sample Ferrin Lane has. */
    public static final List<String> OF_FERRIN_LANE = List.of(
            "",
            "/documents",
            "/documents/D1",
            "/site",
            "/lights",
            "/lights/proposed/types/A1",
            "/lights/proposed/positions?type=A2",
            "/lights/proposed/positions?add=block&type=A9",
            "/lights/proposed/positions/A1-01",
            "/places",
            "/places?add=polar",
            "/places/VA1",
            "/plan",
            "/plan?scheme=mended&units=us&from=50",
            "/history",
            "/history/1",
            "/delete");

    /** Other forms of these pages, and pages that a browser test of their own looks at. */
    public static final List<String> MORE_OF_FERRIN_LANE = List.of(
            "?scheme=mended",
            "/lights/proposed/positions",
            "/lights/proposed/positions?add=polar",
            "/lights/proposed/positions?add=row",
            "/lights/proposed/positions?add=ring",
            "/seen/VA4?harm=glare",
            "/sky/VA4");

    private ProjectPages() {}
}
