package twofold.design;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;

/** One pass over a design that collects its problems; lives for one call of {@link Design#problems()}. */
final class Review {
    /** How far a black box's determinant may be from 1: what four numbers typed to ten digits make. */
    private static final double DETERMINANT = 1e-9;

    /** How far reflectance and transmittance may add up beyond 1: the rounding of their sum. */
    private static final double SUM = 1e-12;

    /** After so many problems, unknown names come without the nearest known one, whose search takes long. */
    private static final int HINTED = 200;

    private final Design design;
    private final List<Part> parts;
    private final Map<String, Part> byName = new HashMap<>();
    private final List<String> names;
    private final List<String> mirrors;
    /** The parts that have a settable field, by its name. */
    private final Map<String, List<String>> having = new HashMap<>();

    private final List<Problem> found = new ArrayList<>();

    Review(Design design) {
        this.design = design;
        this.parts = design.parts();
        parts.forEach(p -> byName.putIfAbsent(p.name(), p));
        names = parts.stream().map(Part::name).distinct().toList();
        mirrors = design.mirrors().stream().map(Part::name).toList();
    }

    List<Problem> problems() {
        double wave = design.wavelength();
        if (!(wave >= Design.SHORTEST_WAVE && wave <= Design.LONGEST_WAVE)) {
            add(
                    Subject.DOCUMENT.at("wavelength_nm"),
                    "found " + text(Unit.NM, wave),
                    "a number from " + Unit.NM.text(Design.SHORTEST_WAVE) + " to " + Unit.NM.text(Design.LONGEST_WAVE));
        }
        counts();
        names(Subject.DOCUMENT.at("parts"), parts.stream().map(Part::name).toList());
        for (int i = 0; i < parts.size(); i++) {
            part(Subject.part(i), parts.get(i));
        }
        for (int i = 0; i < design.holds().size(); i++) {
            hold(Subject.DOCUMENT.at("holds").at(i), design.holds().get(i));
        }
        names(
                Subject.DOCUMENT.at("levers"),
                design.levers().stream().map(Lever::name).toList());
        for (int i = 0; i < design.levers().size(); i++) {
            lever(Subject.DOCUMENT.at("levers").at(i), design.levers().get(i));
        }
        for (int i = 0; i < design.requirements().size(); i++) {
            requirement(
                    Subject.DOCUMENT.at("requirements").at(i),
                    design.requirements().get(i));
        }
        for (int i = 0; i < design.tolerances().size(); i++) {
            tolerance(
                    Subject.DOCUMENT.at("tolerances").at(i), design.tolerances().get(i));
        }
        return List.copyOf(found);
    }

    /** What is wrong with one requirement, with places as if it were the first. */
    List<Problem> problems(Requirement requirement) {
        requirement(Subject.DOCUMENT.at("requirements").at(0), requirement);
        return List.copyOf(found);
    }

    private void add(Subject where, String what, String accepted) {
        found.add(new Problem(where, what, accepted));
    }

    private void counts() {
        Subject where = Subject.DOCUMENT.at("parts");
        if (parts.size() > Design.MOST_PARTS) {
            add(where, "found " + parts.size() + " parts", "at most " + Design.MOST_PARTS);
        }
        boolean ring = design.shape() == Shape.RING;
        int least = ring ? 3 : 2;
        if (mirrors.size() < least) {
            add(
                    where,
                    "found " + mirrors.size() + (mirrors.size() == 1 ? " mirror" : " mirrors"),
                    "at least " + least + " mirrors in a " + design.shape().word());
        }
        if (parts.isEmpty()) {
            return;
        }
        end(0, "a mirror as the first part");
        if (!ring) {
            end(parts.size() - 1, "a mirror as the last part of a standing-wave");
        }
    }

    private void end(int index, String accepted) {
        Kind kind = parts.get(index).kind();
        if (kind != Kind.MIRROR) {
            add(Subject.part(index).at("kind"), "found \"" + kind.word() + "\"", accepted);
        }
    }

    private void names(Subject list, List<String> names) {
        Set<String> seen = new HashSet<>();
        for (int i = 0; i < names.size(); i++) {
            String name = names.get(i);
            Subject where = list.at(i).at("name");
            if (!Names.accepts(name)) {
                add(where, "found \"" + Names.shown(name) + "\"", Names.ACCEPTED);
            } else if (!seen.add(name)) {
                add(where, "found \"" + name + "\" a second time", "a name that nothing else in the list has");
            }
        }
    }

    private void part(Subject where, Part part) {
        part.values().stated().forEach((field, value) -> numbers(where.at(field.json()), field, value));
        part.match(new Part.Cases<Void>() {
            @Override
            public Void mirror(Mirror m) {
                boolean each =
                        Field.REFLECTANCE.accepts(m.reflectance()) && Field.TRANSMITTANCE.accepts(m.transmittance());
                if (each && m.reflectance() + m.transmittance() > 1 + SUM) {
                    add(
                            where.at("transmittance"),
                            "found " + Unit.ONE.text(m.transmittance()) + " beside a reflectance of "
                                    + Unit.ONE.text(m.reflectance()),
                            "a sum of at most 1");
                }
                return done();
            }

            @Override
            public Void lens(Lens l) {
                if (l.tilt() != 0 && l.glass().index().orElse(0) == 1) {
                    add(where.at("index"), "found 1 for a tilted lens", "an index above 1");
                }
                if (l.tilt() != 0 && l.glass().isNone()) {
                    add(
                            where.at("incidence_deg"),
                            "found " + Unit.DEG.text(l.tilt()) + " without an index",
                            "index or material beside it, or 0");
                }
                return done();
            }

            @Override
            public Void plate(Plate p) {
                return slab(p.slab());
            }

            @Override
            public Void crystal(Crystal c) {
                return slab(c.slab());
            }

            private Void slab(Slab s) {
                if (s.glass().isNone()) {
                    add(where, "found neither index nor material", "one of them");
                }
                if (s.side().of() != s.tiltPlane()) {
                    add(
                            where.at("side"),
                            "found \"" + s.side().word() + "\" for a "
                                    + s.tiltPlane().word() + " tilt",
                            s.tiltPlane() == TiltPlane.TANGENTIAL ? "\"left\" or \"right\"" : "\"up\" or \"down\"");
                }
                return done();
            }

            @Override
            public Void aperture(Aperture a) {
                if (a.hole().isPresent()
                        && (a.slitTangential().isPresent() || a.slitSagittal().isPresent())) {
                    add(where.at("diameter_mm"), "found a hole beside a slit", "a hole, or slits, or neither");
                }
                return done();
            }

            @Override
            public Void matrix(Matrix m) {
                determinant("tangential", m.tangential());
                determinant("sagittal", m.sagittal());
                return done();
            }

            private void determinant(String plane, FourNumbers m) {
                double scale = Math.max(1, Math.abs(m.a() * m.d()));
                if (!(Math.abs(m.determinant() - 1) <= DETERMINANT * scale)) {
                    add(
                            where.at(plane),
                            "found the determinant " + text(Unit.ONE, m.determinant()),
                            "a determinant A D − B C of 1");
                }
            }

            @SuppressWarnings("NullAway") // Void has no other value
            private Void done() {
                return null;
            }
        });
    }

    private void numbers(Subject where, Field field, Object value) {
        if (value instanceof Double d) {
            if (!(field == Field.ROC && d == Double.POSITIVE_INFINITY)) {
                number(where, field, d);
            }
        } else if (value instanceof Point p) {
            number(where.at(0), field, p.x());
            number(where.at(1), field, p.y());
        } else if (value instanceof Mount m) {
            number(where.at(0), field, m.width());
            number(where.at(1), field, m.depth());
        } else if (value instanceof Along a && !a.inMiddle()) {
            number(where, field, a.path());
        } else if (value instanceof FaceAngle f && !f.atBrewster()) {
            number(where, field, f.incidence());
        } else if (value instanceof TwoPowers p) {
            number(where, field, p.tangential());
            if (p.sagittal() != p.tangential()) {
                number(where, field, p.sagittal());
            }
        } else if (value instanceof FourNumbers m) {
            number(where.at(0), field, Unit.ONE, m.a());
            number(where.at(1), field, Unit.MM, m.b());
            number(where.at(2), field, Unit.PER_MM, m.c());
            number(where.at(3), field, Unit.ONE, m.d());
        }
    }

    private void number(Subject where, Field field, double si) {
        number(where, field, field.unit(), si);
    }

    private void number(Subject where, Field field, Unit unit, double si) {
        if (!field.accepts(si)) {
            add(where, "found " + text(unit, si), field.accepted());
        }
    }

    private static String text(Unit unit, double si) {
        return Double.isFinite(si) ? unit.text(si) : Double.toString(si);
    }

    private void hold(Subject where, Hold hold) {
        if (hold instanceof Hold.Leg h) {
            leg(where.at("leg"), h.leg());
        } else if (hold instanceof Hold.Direction h) {
            leg(where.at("direction"), h.leg());
        } else if (hold instanceof Hold.Incidence h) {
            folding(where.at("incidence"), h.mirror());
        } else if (hold instanceof Hold.Position h) {
            mirror(where.at("place"), h.mirror());
        }
    }

    private void mirror(Subject where, String name) {
        Part part = known(where, name, mirrors);
        if (part != null && part.kind() != Kind.MIRROR) {
            add(where, "found \"" + Names.shown(name) + "\", a " + part.kind().word(), "the name of a mirror");
        }
    }

    private void folding(Subject where, String name) {
        mirror(where, name);
        if (design.shape() == Shape.STANDING_WAVE
                && (mirrors.indexOf(name) == 0 || mirrors.indexOf(name) == mirrors.size() - 1)
                && mirrors.contains(name)) {
            add(where, "found the end mirror \"" + name + "\", which is met head-on", "a mirror that folds the beam");
        }
    }

    /** The nearest known name; searched for only as long as a person would read on. */
    private String hint(String name, List<String> near) {
        return found.size() < HINTED ? Names.hint(name, near) : "";
    }

    private @org.jspecify.annotations.Nullable Part known(Subject where, String name, List<String> near) {
        Part part = byName.get(name);
        if (part == null) {
            add(
                    where,
                    "found \"" + Names.shown(name) + "\", which no part is called" + hint(name, near),
                    "the name of a part");
        }
        return part;
    }

    private void leg(Subject where, Place leg) {
        if (leg.second().isEmpty()) {
            add(where, "found \"" + Names.shown(leg.toString()) + "\"", "two neighbouring mirrors");
            return;
        }
        String a = leg.first();
        String b = leg.second().get();
        mirror(where.at(0), a);
        mirror(where.at(1), b);
        int i = mirrors.indexOf(a);
        int j = mirrors.indexOf(b);
        if (i >= 0 && j >= 0 && !neighbours(i, j, mirrors.size())) {
            add(
                    where,
                    "found \"" + Names.shown(a) + "\" and \"" + Names.shown(b) + "\", which no leg joins",
                    "two neighbouring mirrors");
        }
    }

    private boolean neighbours(int i, int j, int count) {
        return Math.abs(i - j) == 1 || (design.shape() == Shape.RING && i != j && Math.abs(i - j) == count - 1);
    }

    private void settings(Subject where, String set, List<Place> of) {
        if (Field.settableUnit(set).isEmpty()) {
            add(
                    where.at("set"),
                    "found \"" + Names.shown(set) + "\"" + Names.hint(set, Field.settableNames()),
                    String.join(", ", Field.settableNames()));
            return;
        }
        if (of.isEmpty()) {
            add(where.at("of"), "found an empty list", "at least one name");
        }
        Set<Place> seen = new HashSet<>();
        for (int i = 0; i < of.size(); i++) {
            Subject here = where.at("of").at(i);
            Place place = of.get(i);
            if (!seen.add(place)) {
                add(here, "found \"" + Names.shown(place.toString()) + "\" a second time", "each once");
            } else if (set.equals("leg_mm")) {
                leg(here, place);
            } else if (place.second().isPresent()) {
                add(here, "found a pair", "the name of a part");
            } else if (set.equals("x_mm") || set.equals("y_mm")) {
                mirror(here, place.first());
            } else {
                settable(here, set, place.first());
            }
        }
    }

    private void settable(Subject where, String set, String name) {
        List<String> fitting = having.computeIfAbsent(
                set,
                s -> parts.stream()
                        .filter(p -> p.kind().field(s).filter(Field::isSettable).isPresent())
                        .map(Part::name)
                        .toList());
        Part part = known(where, name, fitting.isEmpty() ? names : fitting);
        if (part == null) {
            return;
        }
        if (part.kind().field(set).filter(Field::isSettable).isEmpty()) {
            add(
                    where,
                    "found \"" + Names.shown(name) + "\", a " + part.kind().word() + ", which has no " + set,
                    fitting.isEmpty() ? "a part that has it" : "one of " + Names.listed(fitting));
        } else if (part.kind() == Kind.MIRROR && set.equals("incidence_deg")) {
            folding(where, name);
        }
    }

    private void lever(Subject where, Lever lever) {
        settings(where, lever.set(), lever.of());
        if (lever.range() instanceof Lever.Range.Span span) {
            value(where.at("from"), lever.set(), lever.of(), span.from());
            value(where.at("to"), lever.set(), lever.of(), span.to());
            if (span.from() == span.to()) {
                add(where.at("to"), "found the same value as from", "another value");
            }
        } else if (lever.range() instanceof Lever.Range.Among among) {
            if (among.values().isEmpty()) {
                add(where.at("among"), "found an empty list", "at least one value");
            }
            for (int i = 0; i < among.values().size(); i++) {
                value(
                        where.at("among").at(i),
                        lever.set(),
                        lever.of(),
                        among.values().get(i));
            }
        }
    }

    private void value(Subject where, String set, List<Place> of, double si) {
        Stream<Field> fields = set.equals("x_mm") || set.equals("y_mm")
                ? Stream.of(Field.AT)
                : Arrays.stream(Field.values())
                        .filter(f -> f.json().equals(set) && f.isSettable())
                        .filter(f -> of.stream().anyMatch(p -> has(p, f)));
        fields.filter(f -> !f.accepts(si)).findFirst().ifPresent(f -> number(where, f, si));
    }

    private boolean has(Place place, Field field) {
        Part part = byName.get(place.first());
        return part != null && field.kinds().contains(part.kind());
    }

    private void tolerance(Subject where, Tolerance tolerance) {
        settings(where, tolerance.set(), tolerance.of());
        if (!(tolerance.plusMinus() >= 0)) {
            Unit unit = tolerance.relative()
                    ? Unit.PERCENT
                    : Field.settableUnit(tolerance.set()).orElse(Unit.ONE);
            add(
                    where.at(tolerance.relative() ? "plus_minus_percent" : "plus_minus"),
                    "found " + text(unit, tolerance.plusMinus()),
                    "0 or a positive number");
        }
    }

    private void requirement(Subject where, Requirement r) {
        at(where, r);
        if (r.what().hasPlane() && r.plane().isEmpty()) {
            add(where, "found no plane for " + r.what().json(), "\"plane\": \"tangential\", \"sagittal\" or \"both\"");
        } else if (!r.what().hasPlane() && r.plane().isPresent()) {
            add(
                    where.at("plane"),
                    "found \"" + r.plane().get().word() + "\" for " + r.what().json() + ", which has no plane",
                    "no plane");
        }
        if (r.what().hasEdge() && r.edge().isEmpty()) {
            add(where, "found no edge for " + r.what().json(), "\"edge\": \"lower\" or \"upper\"");
        } else if (!r.what().hasEdge() && r.edge().isPresent()) {
            add(where.at("edge"), "found an edge for " + r.what().json() + ", which has none", "no edge");
        }
        if (r.bound() instanceof Bound.Between b && !(b.low() < b.high())) {
            Unit unit = r.what().unit();
            add(
                    where.at("between"),
                    "found " + text(unit, b.low()) + " before " + text(unit, b.high()),
                    "two numbers, the smaller first");
        } else if (r.bound() instanceof Bound.Equal e && !(e.within() > 0)) {
            add(where.at("within"), "found " + text(r.what().unit(), e.within()), "a number above 0");
        }
        r.over().ifPresent(name -> {
            List<String> levers = design.levers().stream().map(Lever::name).toList();
            if (!levers.contains(name)) {
                add(
                        where.at("over"),
                        "found \"" + Names.shown(name) + "\", which no lever is called" + Names.hint(name, levers),
                        levers.isEmpty() ? "the name of a lever" : Names.listed(levers));
            }
        });
    }

    private void at(Subject where, Requirement r) {
        Subject here = where.at("at");
        Quantity.Where rule = r.what().where();
        if (r.at().isEmpty()) {
            if (rule != Quantity.Where.NOWHERE && rule != Quantity.Where.ANYWHERE_OR_PART) {
                add(where, "found no place for " + r.what().json(), "\"at\": " + rule.words());
            }
            return;
        }
        Place place = r.at().get();
        boolean pair = place.second().isPresent();
        boolean fits = switch (rule) {
            case NOWHERE -> false;
            case ANYWHERE_OR_PART, PART -> !pair;
            case MIRROR -> !pair && isKind(place, Kind.MIRROR);
            case CRYSTAL -> !pair && isKind(place, Kind.CRYSTAL);
            case SLAB -> !pair && (isKind(place, Kind.CRYSTAL) || isKind(place, Kind.PLATE));
            case SLAB_OR_STRETCH -> pair || isKind(place, Kind.CRYSTAL) || isKind(place, Kind.PLATE);
            case PART_OR_STRETCH -> true;
            case LEG -> pair;
        };
        if (!fits) {
            add(
                    here,
                    "found \"" + Names.shown(place.toString()) + "\" for "
                            + r.what().json(),
                    rule.words());
        } else if (rule == Quantity.Where.LEG) {
            leg(here, place);
        } else if (pair) {
            stretch(here, place);
        } else {
            known(here, place.first(), names);
        }
    }

    /** Whether the part is of a kind; a name that nothing has is another problem's. */
    private boolean isKind(Place place, Kind kind) {
        Part part = byName.get(place.first());
        return part == null || part.kind() == kind;
    }

    private void stretch(Subject where, Place place) {
        String a = place.first();
        String b = place.second().orElseThrow();
        Part first = known(where.at(0), a, names);
        Part second = known(where.at(1), b, names);
        if (first == null || second == null) {
            return;
        }
        int i = Math.min(parts.indexOf(first), parts.indexOf(second));
        int j = Math.max(parts.indexOf(first), parts.indexOf(second));
        boolean round = design.shape() == Shape.RING && i == 0;
        if (i == j || (!isFree(i + 1, j) && !(round && isFree(j + 1, parts.size())))) {
            boolean isLeg = mirrors.contains(a)
                    && mirrors.contains(b)
                    && neighbours(mirrors.indexOf(a), mirrors.indexOf(b), mirrors.size());
            add(
                    where,
                    "found \"" + Names.shown(a) + "\" and \"" + Names.shown(b) + "\", "
                            + (isLeg ? "a leg with more than one free stretch" : "which do not follow each other"),
                    "a leg of one free stretch, or two parts with nothing but air and apertures between");
        }
    }

    private boolean isFree(int from, int to) {
        return parts.subList(from, Math.max(from, to)).stream().allMatch(p -> p.kind() == Kind.APERTURE);
    }
}
