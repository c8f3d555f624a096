package spanwright.fault;

import spanwright.quantity.Length;

/**
 * A stretch of a path's glass that lies in one way.
 *
 * @param element index of its element on the path
 * @param kind how it lies
 * @param length its length by the records
 * @param index its group index; 1 where readings are meters of glass
 */
record GlassPart(int element, Kind kind, Length length, double index) {

    /** How glass lies. */
    enum Kind {
        /** In the tray that the walk leaves. */
        TRAY_FROM,
        /** In the sheath. */
        SHEATH,
        /** In the tray that the walk comes to. */
        TRAY_TO,
        /** In a jumper. */
        JUMPER
    }

    boolean tray() {
        return kind == Kind.TRAY_FROM || kind == Kind.TRAY_TO;
    }

    /** Its optical length in meters. */
    double optical() {
        return length.metres() * index;
    }
}
