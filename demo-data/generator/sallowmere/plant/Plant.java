package sallowmere.plant;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import sallowmere.geo.Point;

/** All structures, spans and cables, in the order in which they were made. */
public final class Plant {
    private final Map<String, Structure> structures = new LinkedHashMap<>();
    private final Map<String, Span> spans = new LinkedHashMap<>();
    private final Map<String, Cable> cables = new LinkedHashMap<>();

    /** Sets up a structure on a road, without risk or note. */
    public Structure structure(String code, String kind, Point at, String road) {
        return structure(new Structure(code, kind, at, road, "", ""));
    }

    /** Sets up a structure; its code must be new. */
    public Structure structure(Structure structure) {
        if (structures.putIfAbsent(structure.code(), structure) != null) {
            throw new IllegalStateException("structure twice: " + structure.code());
        }
        return structure;
    }

    /** The straight span between two structures, made where there is none yet. */
    public Span span(Structure from, Structure to, String placement) {
        return span(from, to, placement, List.of(), "");
    }

    /** The span between two structures, made where there is none yet. */
    public Span span(Structure from, Structure to, String placement, List<Point> bends, String risk) {
        Span there = spans.get(to.code() + "_" + from.code());
        if (there != null) {
            return there;
        }
        String code = from.code() + "_" + to.code();
        return spans.computeIfAbsent(code, made -> new Span(made, from, to, placement, bends, risk));
    }

    /** Adds a cable; its code must be new. */
    public Cable cable(Cable cable) {
        if (cables.putIfAbsent(cable.code(), cable) != null) {
            throw new IllegalStateException("cable twice: " + cable.code());
        }
        return cable;
    }

    /** The structure of a code, which must be there. */
    public Structure structureOf(String code) {
        Structure structure = structures.get(code);
        if (structure == null) {
            throw new IllegalStateException("no structure " + code);
        }
        return structure;
    }

    /** The cable of a code, which must be there. */
    public Cable cableOf(String code) {
        Cable cable = cables.get(code);
        if (cable == null) {
            throw new IllegalStateException("no cable " + code);
        }
        return cable;
    }

    /** All structures. */
    public List<Structure> structures() {
        return new ArrayList<>(structures.values());
    }

    /** All spans. */
    public List<Span> spans() {
        return new ArrayList<>(spans.values());
    }

    /** All cables. */
    public List<Cable> cables() {
        return new ArrayList<>(cables.values());
    }
}
