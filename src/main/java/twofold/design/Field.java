package twofold.design;

import static twofold.design.Kind.APERTURE;
import static twofold.design.Kind.CRYSTAL;
import static twofold.design.Kind.LENS;
import static twofold.design.Kind.MATRIX;
import static twofold.design.Kind.MIRROR;
import static twofold.design.Kind.PLATE;

import java.util.Arrays;
import java.util.Collections;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * Every field of every kind of part: its JSON name, unit, form, limits, default, kinds and meaning. Readers, writers,
 * messages, inspectors and levers all take them from here.
 *
 * <p>Two constants share a JSON name where two kinds mean different things by it or differ in default.
 */
@SuppressWarnings("ImmutableEnumChecker") // the defaults are records, the set of kinds cannot be changed
public enum Field {
    /** Position of a mirror's vertex. */
    AT("at_mm", Unit.MM, Form.POINT, -1e6, 1e6, Need.REQUIRED, null, "position on the table, [x, y]", MIRROR),
    /** Radius of curvature of a mirror; +∞ is flat. */
    ROC(
            "roc_mm",
            Unit.MM,
            Form.SIGNED,
            1e-6,
            1e12,
            Need.OPTIONAL,
            Double.POSITIVE_INFINITY,
            "radius of curvature, positive concave, negative convex, absent flat",
            MIRROR),
    /** Another way to state a mirror's radius; never stored. */
    CURVATURE(
            "curvature_per_m",
            Unit.PER_M,
            Form.NUMBER,
            -1e6,
            1e6,
            Need.OTHER_FORM,
            null,
            "curvature, 0 flat, instead of roc_mm",
            MIRROR),
    /** Power reflectance. */
    REFLECTANCE("reflectance", Unit.ONE, Form.NUMBER, 0, 1, Need.OPTIONAL, 1.0, "share of power reflected", MIRROR),
    /** Power transmittance. */
    TRANSMITTANCE(
            "transmittance", Unit.ONE, Form.NUMBER, 0, 1, Need.OPTIONAL, 0.0, "share of power transmitted", MIRROR),
    /** Diameter of a mirror's substrate. */
    DIAMETER("diameter_mm", Unit.MM, Form.POSITIVE, 0, 1e3, Need.OPTIONAL, 25.4e-3, "diameter of the optic", MIRROR),
    /** Thickness of a mirror's substrate. */
    SUBSTRATE("thickness_mm", Unit.MM, Form.POSITIVE, 0, 1e3, Need.OPTIONAL, 6.35e-3, "thickness of the optic", MIRROR),

    /** Place along the leg. */
    ALONG(
            "along_mm",
            Unit.MM,
            Form.ALONG,
            0,
            1e6,
            Need.REQUIRED,
            null,
            "path from the mirror before to the middle of the part, or \"middle\" of the leg",
            LENS,
            PLATE,
            CRYSTAL,
            APERTURE,
            MATRIX),
    /** Focal length of a thin lens in air. */
    FOCAL_LENGTH(
            "focal_length_mm",
            Unit.MM,
            Form.SIGNED,
            1e-6,
            1e12,
            Need.REQUIRED,
            null,
            "focal length in air, negative diverges",
            LENS),
    /** Thickness of a plate across its faces. */
    ACROSS("thickness_mm", Unit.MM, Form.POSITIVE, 0, 1e3, Need.REQUIRED, null, "thickness across the faces", PLATE),
    /** Path inside a crystal. */
    INSIDE("length_mm", Unit.MM, Form.POSITIVE, 0, 1e3, Need.REQUIRED, null, "path inside along the beam", CRYSTAL),
    /** Physical length of a black box. */
    BOX("length_mm", Unit.MM, Form.NUMBER, 0, 1e6, Need.OPTIONAL, 0.0, "physical length of the box", MATRIX),
    /** Phase index. */
    INDEX("index", Unit.ONE, Form.NUMBER, 1, 10, Need.OPTIONAL, null, "index of refraction", LENS, PLATE, CRYSTAL),
    /** Name of a material. */
    MATERIAL("material", Unit.ONE, Form.TEXT, 0, 0, Need.OPTIONAL, null, "name of a material", LENS, PLATE, CRYSTAL),
    /** Tilt of a lens. */
    TILT(
            "incidence_deg",
            Unit.DEG,
            Form.NUMBER,
            0,
            Limits.GRAZING,
            Need.OPTIONAL,
            0.0,
            "angle of incidence of a tilted lens",
            LENS),
    /** Incidence on the faces of a slab. */
    FACES(
            "incidence_deg",
            Unit.DEG,
            Form.FACE_ANGLE,
            0,
            Limits.GRAZING,
            Need.OPTIONAL,
            FaceAngle.of(0),
            "angle of incidence on the faces, or \"brewster\"",
            PLATE,
            CRYSTAL),
    /** The plane of the tilt. */
    TILT_PLANE(
            "tilt_plane",
            Unit.ONE,
            Form.TILT_PLANE,
            0,
            0,
            Need.OPTIONAL,
            twofold.design.TiltPlane.TANGENTIAL,
            "plane of the tilt",
            LENS,
            PLATE,
            CRYSTAL),
    /** The way the beam is shifted. */
    SIDE("side", Unit.ONE, Form.SIDE, 0, 0, Need.OPTIONAL, null, "the way the beam is shifted", PLATE, CRYSTAL),
    /** Thermal lens inside a crystal. */
    THERMAL_POWER(
            "thermal_power_per_m",
            Unit.PER_M,
            Form.POWERS,
            -1e6,
            1e6,
            Need.OPTIONAL,
            TwoPowers.NONE,
            "power of a lens in the middle, inside the faces: a number, or [tangential, sagittal]",
            CRYSTAL),
    /** Hole of an aperture. */
    HOLE("diameter_mm", Unit.MM, Form.POSITIVE, 0, 1e3, Need.OPTIONAL, null, "diameter of the hole", APERTURE),
    /** Slit across the tangential direction. */
    SLIT_TANGENTIAL(
            "slit_tangential_mm",
            Unit.MM,
            Form.POSITIVE,
            0,
            1e3,
            Need.OPTIONAL,
            null,
            "full width of a slit in the tangential plane",
            APERTURE),
    /** Slit across the sagittal direction. */
    SLIT_SAGITTAL(
            "slit_sagittal_mm",
            Unit.MM,
            Form.POSITIVE,
            0,
            1e3,
            Need.OPTIONAL,
            null,
            "full width of a slit in the sagittal plane",
            APERTURE),
    /** Tangential matrix of a black box. */
    TANGENTIAL(
            "tangential",
            Unit.MM,
            Form.MATRIX,
            -1e12,
            1e12,
            Need.REQUIRED,
            null,
            "[A, B, C, D] of the forward pass, reduced slopes, lengths in mm",
            MATRIX),
    /** Sagittal matrix of a black box. */
    SAGITTAL(
            "sagittal",
            Unit.MM,
            Form.MATRIX,
            -1e12,
            1e12,
            Need.REQUIRED,
            null,
            "[A, B, C, D] of the forward pass, reduced slopes, lengths in mm",
            MATRIX),
    /** Diameter through which the beam passes or on which it falls. */
    CLEAR_DIAMETER(
            "clear_diameter_mm",
            Unit.MM,
            Form.POSITIVE,
            0,
            1e3,
            Need.OPTIONAL,
            null,
            "diameter that the beam may use",
            MIRROR,
            LENS,
            PLATE,
            CRYSTAL),
    /** Loss a pass. */
    LOSS("loss", Unit.ONE, Form.NUMBER, 0, 1, Need.OPTIONAL, 0.0, "share of power lost a pass", LENS, PLATE, CRYSTAL),
    /** Mount of a mirror. */
    MOUNT(
            "mount_mm",
            Unit.MM,
            Form.MOUNT,
            0,
            1e3,
            Need.OPTIONAL,
            new Mount(48e-3, 25e-3),
            "mount, [width, depth behind the face]",
            MIRROR),
    /** Mount of a lens. */
    LENS_MOUNT(
            "mount_mm",
            Unit.MM,
            Form.MOUNT,
            0,
            1e3,
            Need.OPTIONAL,
            new Mount(35e-3, 12e-3),
            "mount, [width, depth], centred",
            LENS),
    /** Mount of a slab. */
    SLAB_MOUNT(
            "mount_mm",
            Unit.MM,
            Form.MOUNT,
            0,
            1e3,
            Need.OPTIONAL,
            null,
            "mount, [width, depth], centred; absent: not checked for clearance",
            PLATE,
            CRYSTAL),

    /** Typing form: path from the mirror before. */
    LEG(
            "leg_mm",
            Unit.MM,
            Form.POSITIVE,
            0,
            1e6,
            Need.OTHER_FORM,
            null,
            "path from the mirror before, inside parts included, instead of at_mm",
            MIRROR),
    /** Typing form: incidence at an inner mirror. */
    INCIDENCE(
            "incidence_deg",
            Unit.DEG,
            Form.NUMBER,
            0,
            Limits.GRAZING,
            Need.OTHER_FORM,
            null,
            "angle of incidence, to lay out the next leg",
            MIRROR),
    /** Typing form: the way the beam turns. */
    TURN("turn", Unit.ONE, Form.TURN, 0, 0, Need.OTHER_FORM, null, "the way the beam turns", MIRROR),
    /** Typing form: direction of the first leg. */
    HEADING(
            "heading_deg",
            Unit.DEG,
            Form.NUMBER,
            -Limits.FULL_TURN,
            Limits.FULL_TURN,
            Need.OTHER_FORM,
            null,
            "direction of the first leg, from +x towards +y",
            MIRROR);

    /** What a value looks like; each form belongs to one Java type. */
    public enum Form {
        /** A {@code Double} within the limits. */
        NUMBER,
        /** A {@code Double} above 0, up to the limit. */
        POSITIVE,
        /** A {@code Double} whose magnitude is within the limits. */
        SIGNED,
        /** {@link Point}. */
        POINT,
        /** {@link twofold.design.Mount}, both numbers above 0. */
        MOUNT,
        /** {@link twofold.design.Along}. */
        ALONG,
        /** {@link twofold.design.FaceAngle}. */
        FACE_ANGLE,
        /** {@link TwoPowers}. */
        POWERS,
        /** {@link FourNumbers}; b scales with the unit, c with its inverse. */
        MATRIX,
        /** {@link twofold.design.TiltPlane}. */
        TILT_PLANE,
        /** {@link twofold.design.Side}. */
        SIDE,
        /** {@link twofold.design.Turn}. */
        TURN,
        /** {@code String}. */
        TEXT
    }

    /** Whether a field must be there. */
    public enum Need {
        /** Refused when absent. */
        REQUIRED,
        /** May be absent. */
        OPTIONAL,
        /** Another way to state a required or optional field; read, never stored. */
        OTHER_FORM
    }

    /** Angles that limit fields, rad. */
    public static final class Limits {
        /** From here on an incidence is refused: 89°. */
        public static final double GRAZING = Unit.DEG.toSi(89);

        static final double FULL_TURN = Unit.DEG.toSi(360);

        private Limits() {}
    }

    private final String json;
    private final Unit unit;
    private final Form form;
    private final double least;
    private final double most;
    private final Need need;
    private final @Nullable Object fallback;
    private final String doc;
    private final Set<Kind> kinds;

    Field(
            String json,
            Unit unit,
            Form form,
            double least,
            double most,
            Need need,
            @Nullable Object fallback,
            String doc,
            Kind first,
            Kind... more) {
        this.json = json;
        this.unit = unit;
        this.form = form;
        this.least = least;
        this.most = most;
        this.need = need;
        this.fallback = fallback;
        this.doc = doc;
        this.kinds = Collections.unmodifiableSet(EnumSet.of(first, more));
    }

    /** The name in a file, with its unit. */
    public String json() {
        return json;
    }

    /** Its name for a person, mostly the JSON name without its unit: "clear diameter". */
    public String title() {
        return switch (this) {
            case AT -> "position";
            case ROC -> "radius of curvature";
            case TANGENTIAL, SAGITTAL -> json + " matrix";
            default -> title(json);
        };
    }

    /** What can be set under a JSON name, for a person: "radius of curvature", "leg", "x". */
    public static String title(String set) {
        return set.equals(ROC.json)
                ? ROC.title()
                : set.replaceFirst("(_per)?_(mm|deg|m)$", "").replace('_', ' ');
    }

    /** The unit in a file. */
    public Unit unit() {
        return unit;
    }

    /** What a value looks like. */
    public Form form() {
        return form;
    }

    /** Whether it must be there. */
    public Need need() {
        return need;
    }

    /** The value that an absent field has; empty where absence itself is a value. */
    public Optional<Object> fallback() {
        return Optional.ofNullable(fallback);
    }

    /** What it is, in a few words. */
    public String doc() {
        return doc;
    }

    /** The kinds of part that have it. */
    public Set<Kind> kinds() {
        return kinds;
    }

    /**
     * Whether a number may stand in this field, or in each place of it.
     *
     * @param si finite or not
     */
    public boolean accepts(double si) {
        return switch (form) {
            case POSITIVE, MOUNT -> si > 0 && si <= most;
            case SIGNED -> Math.abs(si) >= least && Math.abs(si) <= most;
            case FACE_ANGLE -> si >= least && si < most;
            case NUMBER -> si >= least && (most == Limits.GRAZING ? si < most : si <= most);
            case POINT, ALONG, POWERS, MATRIX -> si >= least && si <= most;
            case TILT_PLANE, SIDE, TURN, TEXT -> false;
        };
    }

    /** What a number in this field may be, in the file's unit: "a number above 0, up to 1000". */
    public String accepted() {
        String low = unit.text(least);
        String high = unit.text(most);
        return switch (form) {
            case POSITIVE -> "a number above 0, up to " + high;
            case MOUNT -> "two numbers, each above 0, up to " + high;
            case SIGNED -> "a number from " + low + " to " + high + ", or the same negative";
            case NUMBER -> "a number from " + low + " to " + (most == Limits.GRAZING ? "below " : "") + high;
            case FACE_ANGLE -> "a number from " + low + " to below " + high + ", or \"brewster\"";
            case ALONG -> "a number from " + low + " to " + high + ", or \"middle\"";
            case POINT -> "two numbers, each from " + low + " to " + high;
            case POWERS -> "a number from " + low + " to " + high + ", or two of them";
            case MATRIX ->
                "four numbers, [A, B, C, D], A and D up to " + Unit.ONE.text(most) + ", B up to " + Unit.MM.text(most)
                        + " mm, C up to " + Unit.PER_MM.text(most) + " per mm";
            case TILT_PLANE -> "\"tangential\" or \"sagittal\"";
            case SIDE -> "\"left\" or \"right\", for a sagittal tilt \"up\" or \"down\"";
            case TURN -> "\"left\" or \"right\"";
            case TEXT -> "a text";
        };
    }

    /** What an absent field comes to, in words, in the file's unit. */
    public String absent() {
        if (fallback instanceof Double d) {
            return Double.isInfinite(d) ? "flat" : unit.text(d);
        }
        if (fallback instanceof twofold.design.Mount m) {
            return "[" + unit.text(m.width()) + ", " + unit.text(m.depth()) + "]";
        }
        if (fallback instanceof FaceAngle || fallback instanceof TwoPowers) {
            return "0";
        }
        return fallback instanceof twofold.design.TiltPlane t ? t.word() : "none";
    }

    /** Whether a lever or tolerance can set this field: it is one number. */
    public boolean isSettable() {
        return this != HEADING
                && switch (form) {
                    case NUMBER, POSITIVE, SIGNED, ALONG, FACE_ANGLE, POWERS -> true;
                    case POINT, MOUNT, MATRIX, TILT_PLANE, SIDE, TURN, TEXT -> false;
                };
    }

    /** A legal value, for going on after a fault. */
    public Object standIn() {
        if (fallback != null) {
            return fallback;
        }
        double number = Math.max(least, Math.min(most, form == Form.POSITIVE ? most / 100 : 1));
        return switch (form) {
            case NUMBER, POSITIVE, SIGNED -> number;
            case POINT -> new Point(0, 0);
            case MOUNT -> new Mount(number, number);
            case ALONG -> twofold.design.Along.MIDDLE;
            case FACE_ANGLE -> FaceAngle.of(0);
            case POWERS -> TwoPowers.NONE;
            case MATRIX -> new FourNumbers(1, 0, 0, 1);
            case TILT_PLANE -> twofold.design.TiltPlane.TANGENTIAL;
            case SIDE -> twofold.design.Side.LEFT;
            case TURN -> twofold.design.Turn.LEFT;
            case TEXT -> "";
        };
    }

    /** The unit of a settable number by its JSON name in {@code set}, the plan's own numbers among them. */
    public static Optional<Unit> settableUnit(String set) {
        if (set.equals("x_mm") || set.equals("y_mm")) {
            return Optional.of(Unit.MM);
        }
        return Arrays.stream(values())
                .filter(f -> f.json.equals(set) && f.isSettable())
                .map(Field::unit)
                .findFirst();
    }

    /** Every name that {@code set} accepts, in the order of this vocabulary, then the plan's own. */
    public static List<String> settableNames() {
        return java.util.stream.Stream.concat(
                        Arrays.stream(values()).filter(Field::isSettable).map(Field::json),
                        java.util.stream.Stream.of("x_mm", "y_mm"))
                .distinct()
                .toList();
    }

    /** A number in a field of one number, or what the number is when the field is a number of another form. */
    static OptionalDouble number(@Nullable Object value) {
        return value instanceof Double d ? OptionalDouble.of(d) : OptionalDouble.empty();
    }
}
