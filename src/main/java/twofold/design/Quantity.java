package twofold.design;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** Everything that can be read off a cavity: JSON name, unit, where it may be read, whether it has a plane, meaning, source. */
public enum Quantity {
    /** (A+D)/2 of the round trip. */
    HALF_TRACE(
            "half_trace",
            Unit.ONE,
            Where.NOWHERE,
            true,
            "(A+D)/2 of the unfolded round trip",
            "Kogelnik & Li, Appl. Opt. 5, 1550 (1966)"),
    /** 1 − |half trace|. */
    STABILITY_MARGIN(
            "stability_margin",
            Unit.ONE,
            Where.NOWHERE,
            true,
            "1 − |half trace|",
            "Kogelnik & Li, Appl. Opt. 5, 1550 (1966)"),
    /** Round-trip Gouy phase. */
    GOUY(
            "gouy_deg",
            Unit.DEG,
            Where.NOWHERE,
            true,
            "Gouy phase of a round trip",
            "Kogelnik & Li, Appl. Opt. 5, 1550 (1966)"),
    /** Beam radius. */
    RADIUS(
            "radius_um",
            Unit.UM,
            Where.PART,
            true,
            "1/e² radius of intensity; in a crystal or plate at its middle, inside; of a matrix at its entry",
            "Kogelnik & Li, Appl. Opt. 5, 1550 (1966)"),
    /** Waist radius. */
    WAIST_RADIUS(
            "waist_radius_um",
            Unit.UM,
            Where.SLAB_OR_STRETCH,
            true,
            "radius of the waist",
            "Kogelnik & Li, Appl. Opt. 5, 1550 (1966)"),
    /** Waist place in a slab. */
    WAIST_OFFSET(
            "waist_offset_mm",
            Unit.MM,
            Where.SLAB,
            true,
            "from the part's middle to the waist, positive downstream",
            "Kogelnik & Li, Appl. Opt. 5, 1550 (1966)"),
    /** Waist place in Rayleigh lengths. */
    WAIST_OFFSET_RAYLEIGHS(
            "waist_offset_rayleighs",
            Unit.ONE,
            Where.SLAB,
            true,
            "waist_offset_mm over the Rayleigh length",
            "Kogelnik & Li, Appl. Opt. 5, 1550 (1966)"),
    /** Distance between the planes' waists. */
    WAIST_SPLIT(
            "waist_split_mm",
            Unit.MM,
            Where.SLAB_OR_STRETCH,
            false,
            "tangential minus sagittal waist place, along the beam",
            "a difference of two waist places"),
    /** Smaller radius over larger. */
    ROUNDNESS(
            "roundness",
            Unit.ONE,
            Where.PART_OR_STRETCH,
            false,
            "smaller radius over larger; a leg: of the waists",
            "ISO 11146-1, ellipticity"),
    /** Crystal length over twice the Rayleigh length. */
    FOCUS_RATIO(
            "focus_ratio",
            Unit.ONE,
            Where.CRYSTAL,
            true,
            "crystal length over twice the Rayleigh length",
            "Boyd & Kleinman, J. Appl. Phys. 39, 3597 (1968): l/b"),
    /** Distance between the planes' zone edges. */
    ZONE_EDGE_SPLIT(
            "zone_edge_split_mm",
            Unit.MM,
            Where.LEG,
            false,
            "an edge's place in the tangential minus in the sagittal plane",
            "Kogelnik and others, IEEE J. Quantum Electron. QE-8, 373 (1972)"),
    /** Length on which both planes are stable. */
    ZONE_OVERLAP(
            "zone_overlap_mm",
            Unit.MM,
            Where.LEG,
            false,
            "length of the leg on which both planes are stable, in the sagittal plane's zone",
            "zones as Magni, Appl. Opt. 25, 107 (1986)"),
    /** Angle of incidence. */
    INCIDENCE("incidence_deg", Unit.DEG, Where.MIRROR, false, "angle of incidence at a mirror", "plane geometry"),
    /** Path of a leg. */
    LEG("leg_mm", Unit.MM, Where.LEG, false, "path of a leg, inside parts included", "plane geometry and Snell's law"),
    /** Distance of two mirrors. */
    DISTANCE("distance_mm", Unit.MM, Where.LEG, false, "mirror to mirror by ruler", "plane geometry"),
    /** Path of a round trip. */
    ROUND_TRIP(
            "round_trip_mm", Unit.MM, Where.NOWHERE, false, "path of a round trip", "plane geometry and Snell's law"),
    /** Free spectral range. */
    FSR(
            "fsr_mhz",
            Unit.MHZ,
            Where.NOWHERE,
            false,
            "free spectral range",
            "Siegman, Lasers (1986), ch. 11; with the phase index"),
    /** Smallest gap. */
    CLEARANCE(
            "clearance_mm",
            Unit.MM,
            Where.ANYWHERE_OR_PART,
            false,
            "smallest gap between mounts, and between mounts and the strip of three tangential radii each side",
            "plane geometry; strips of three radii: common practice, no source"),
    /** Power outside a clear aperture. */
    CLIP_LOSS(
            "clip_loss",
            Unit.ONE,
            Where.PART,
            false,
            "power outside the clear aperture, worst face, one pass",
            "integral of the Gaussian intensity"),
    /** Width of the plan. */
    PLAN_WIDTH("plan_width_mm", Unit.MM, Where.NOWHERE, false, "extent of all footprints in x", "plane geometry"),
    /** Depth of the plan. */
    PLAN_DEPTH("plan_depth_mm", Unit.MM, Where.NOWHERE, false, "extent of all footprints in y", "plane geometry");

    /** Where a quantity is read. */
    public enum Where {
        /** Of the whole cavity: no place is given. */
        NOWHERE("no place"),
        /** Of the whole cavity, or of one part. */
        ANYWHERE_OR_PART("no place, or a part"),
        /** At any part. */
        PART("a part"),
        /** At a mirror. */
        MIRROR("a mirror"),
        /** In a crystal. */
        CRYSTAL("a crystal"),
        /** In a crystal or plate. */
        SLAB("a crystal or plate"),
        /** In a crystal or plate, on a leg of one free stretch, or between two neighbouring parts. */
        SLAB_OR_STRETCH("a crystal, a plate, a leg, or two neighbouring parts"),
        /** At a part, on a leg, or between two neighbouring parts. */
        PART_OR_STRETCH("a part, a leg, or two neighbouring parts"),
        /** On a leg: two neighbouring mirrors. */
        LEG("a leg, as two neighbouring mirrors");

        private final String words;

        Where(String words) {
            this.words = words;
        }

        /** In words. */
        public String words() {
            return words;
        }
    }

    private final String json;
    private final Unit unit;
    private final Where where;
    private final boolean hasPlane;
    private final String doc;
    private final String source;

    Quantity(String json, Unit unit, Where where, boolean hasPlane, String doc, String source) {
        this.json = json;
        this.unit = unit;
        this.where = where;
        this.hasPlane = hasPlane;
        this.doc = doc;
        this.source = source;
    }

    /** The name in a file and on the command line. */
    public String json() {
        return json;
    }

    /** The unit in a file. */
    public Unit unit() {
        return unit;
    }

    /** Where it is read. */
    public Where where() {
        return where;
    }

    /** Whether it differs between the planes. */
    public boolean hasPlane() {
        return hasPlane;
    }

    /** Whether it needs to be told which edge. */
    public boolean hasEdge() {
        return this == ZONE_EDGE_SPLIT;
    }

    /** Its name for a person: the JSON name without its unit, "Waist offset in Rayleigh lengths". */
    public String title() {
        String bare = json.replaceFirst("_(mm|um|mhz|deg)$", "")
                .replaceFirst("_rayleighs$", " in Rayleigh lengths")
                .replaceFirst("^fsr$", "free spectral range")
                .replaceFirst("^gouy$", "Gouy phase")
                .replace('_', ' ');
        return Names.capital(bare);
    }

    /** What it is, in a few words. */
    public String doc() {
        return doc;
    }

    /** Where its definition comes from. */
    public String source() {
        return source;
    }

    /** The quantity with a JSON name. */
    public static Optional<Quantity> named(String json) {
        return Arrays.stream(values()).filter(q -> q.json.equals(json)).findFirst();
    }

    /** All JSON names. */
    public static List<String> names() {
        return Arrays.stream(values()).map(Quantity::json).toList();
    }
}
