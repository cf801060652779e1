package twofold.study;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import twofold.cavity.Chain;
import twofold.cavity.Reading;
import twofold.cavity.Trial;
import twofold.cavity.ZoneEdge;
import twofold.cavity.Zones;
import twofold.design.Lever;
import twofold.design.Unit;
import twofold.layout.Laid;
import twofold.layout.Leg;
import twofold.layout.Room;
import twofold.layout.Standing;
import twofold.optics.Plane;

/**
 * Where along a number each plane is stable, and where both are.
 *
 * @param unit in which a person reads the number
 * @param range that was looked at
 * @param tangential ascending; neighbours may touch
 * @param sagittal ascending; neighbours may touch
 * @param both ascending; neighbours may touch
 */
public record StableStretches(
        Unit unit, Stretch range, List<Stretch> tangential, List<Stretch> sagittal, List<Stretch> both) {
    /** Copies the lists. */
    public StableStretches {
        tangential = List.copyOf(tangential);
        sagittal = List.copyOf(sagittal);
        both = List.copyOf(both);
    }

    private static StableStretches of(Unit unit, Stretch range, List<Stretch> tangential, List<Stretch> sagittal) {
        List<Stretch> both = new ArrayList<>();
        for (Stretch t : tangential) {
            for (Stretch s : sagittal) {
                double from = Math.max(t.from(), s.from());
                double to = Math.min(t.to(), s.to());
                if (from < to) {
                    both.add(new Stretch(from, to));
                }
            }
        }
        both.sort(Comparator.comparingDouble(Stretch::from));
        return new StableStretches(unit, range, tangential, sagittal, both);
    }

    /**
     * Along the path of a leg in the chain alone, see {@link Zones}, as far as its parts fit it. A zone without an upper edge
     * counts up to twice the path of now, or to twice its lower edge if that is further.
     *
     * @param leg its number
     */
    public static StableStretches alongLeg(Laid laid, int leg) {
        Trial trial = Chain.of(laid).trial();
        trial.run();
        Zones tangential = Zones.of(trial, leg, Plane.TANGENTIAL);
        Zones sagittal = Zones.of(trial, leg, Plane.SAGITTAL);
        Stretch fits = fits(laid, laid.legs().get(leg));
        double far = Stream.of(tangential, sagittal)
                .flatMap(z -> z.edges().stream())
                .mapToDouble(ZoneEdge::path)
                .max()
                .orElse(0);
        Stretch range = new Stretch(fits.from(), Math.min(fits.to(), 2 * Math.max(far, tangential.path())));
        return of(Unit.MM, range, within(range, tangential), within(range, sagittal));
    }

    private static List<Stretch> within(Stretch range, Zones zones) {
        return zones.zones().stream()
                .map(z -> new Stretch(Math.max(z.from(), range.from()), Math.min(z.to(), range.to())))
                .filter(s -> s.from() < s.to())
                .toList();
    }

    /** The paths of a leg at which its parts fit it: they keep their place from the mirror before, or stay in the middle. */
    private static Stretch fits(Laid laid, Leg leg) {
        double least = 0;
        double most = Double.POSITIVE_INFINITY;
        double before = 0;
        double insideInMiddle = -1;
        for (Standing s : leg.parts()) {
            if (Room.along(laid.design().parts().get(s.part())).inMiddle()) {
                least = Math.max(least, 2 * before + s.length());
                insideInMiddle = s.length();
            } else {
                least = Math.max(least, s.end());
                most = insideInMiddle >= 0 ? Math.min(most, 2 * s.start() - insideInMiddle) : most;
                before = s.end();
            }
        }
        return new Stretch(least, most);
    }

    /**
     * Along a lever, with all that follows it. Edges are found where a sign changes between samples, see
     * {@link ZonesAlong}; values that no layout has are in no stretch.
     *
     * @param lever over a span; need not be one of the design's
     * @param samples how many, spread evenly with both ends
     */
    public static StableStretches alongLever(Laid laid, Lever lever, int samples) {
        Axis axis = Axis.of(lever, samples);
        Asker asker = Asker.of(
                laid, List.of(lever), List.of(chain -> stable(Plane.TANGENTIAL), chain -> stable(Plane.SAGITTAL)));
        List<Double> limits = limits(asker, axis);
        double[] ends = IntStream.range(0, axis.size())
                .mapToDouble(axis::value)
                .sorted()
                .toArray();
        Stretch range = new Stretch(ends[0], ends[ends.length - 1]);
        return of(
                axis.unit(),
                range,
                stretches(laid, axis, asker, limits, Plane.TANGENTIAL),
                stretches(laid, axis, asker, limits, Plane.SAGITTAL));
    }

    /** 1 where a plane has a beam, 0 where not; NaN comes where there is no layout. */
    private static Reading stable(Plane plane) {
        return trial -> trial.hasBeam(plane) ? 1 : 0;
    }

    private static double ask(Asker asker, double value, int answer) {
        double[] answers = new double[2];
        asker.ask(new double[] {value}, answers, 0);
        return answers[answer];
    }

    private static boolean hasNone(Asker asker, double value) {
        return Double.isNaN(ask(asker, value, 0));
    }

    /** Where layouts begin and end along the axis, its ends among them. */
    private static List<Double> limits(Asker asker, Axis axis) {
        List<Double> limits = new ArrayList<>();
        limits.add(axis.value(0));
        boolean before = hasNone(asker, axis.value(0));
        for (int i = 1; i < axis.size(); i++) {
            boolean here = hasNone(asker, axis.value(i));
            if (here != before) {
                double a = axis.value(i - 1);
                double b = axis.value(i);
                while (a + (b - a) / 2 > a && a + (b - a) / 2 < b) {
                    double middle = a + (b - a) / 2;
                    if (hasNone(asker, middle) == before) {
                        a = middle;
                    } else {
                        b = middle;
                    }
                }
                limits.add(b);
            }
            before = here;
        }
        limits.add(axis.value(axis.size() - 1));
        return limits;
    }

    private static List<Stretch> stretches(Laid laid, Axis axis, Asker asker, List<Double> limits, Plane plane) {
        TreeSet<Double> cuts = new TreeSet<>(limits);
        ZonesAlong.of(laid, axis, plane).edges().forEach(e -> cuts.add(e.value()));
        List<Double> bounds = List.copyOf(cuts);
        List<Stretch> stretches = new ArrayList<>();
        for (int i = 1; i < bounds.size(); i++) {
            Stretch stretch = new Stretch(bounds.get(i - 1), bounds.get(i));
            if (ask(asker, stretch.middle(), plane == Plane.TANGENTIAL ? 0 : 1) > 0) {
                stretches.add(stretch);
            }
        }
        return stretches;
    }

    /** How far apart the planes' nearest stretches are where none is in both; 0 where they meet; NaN where a plane has none. */
    public double apart() {
        double apart = Double.NaN;
        for (Stretch t : tangential) {
            for (Stretch s : sagittal) {
                double gap = Math.max(0, Math.max(t.from() - s.to(), s.from() - t.to()));
                apart = Double.isNaN(apart) ? gap : Math.min(apart, gap);
            }
        }
        return apart;
    }

    /** Each plane's stretches with their numbers, and how far apart they are where they do not meet. */
    public String words() {
        String apart = both.isEmpty() && apart() >= 0
                ? "; they are " + unit.shown(apart()) + " " + unit.symbol() + " apart"
                : "";
        return "tangential " + words(tangential) + ", sagittal " + words(sagittal) + apart;
    }

    private String words(List<Stretch> stretches) {
        return stretches.isEmpty()
                ? "stable nowhere from " + unit.shown(range.from()) + " to " + unit.shown(range.to()) + " "
                        + unit.symbol()
                : "stable "
                        + stretches.stream()
                                .map(s -> "from " + unit.shown(s.from()) + " to " + unit.shown(s.to()) + " "
                                        + unit.symbol())
                                .collect(Collectors.joining(" and "));
    }
}
