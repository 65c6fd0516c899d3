package skytally.scene;

/** The kinds of value a scene is drawn from. */
public enum Property {
    COUNT,
    LUMENS,
    SPECTRUM,
    SHAPE,
    TILT,
    BEARING,
    MOUNTING_HEIGHT,
    EYE_HEIGHT,
    DISTANCE,
    LOOK_ANGLE,
    AIR,
    GROUND
}
