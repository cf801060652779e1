package twofold.cavity;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import twofold.design.Kind;
import twofold.optics.Plane;

/**
 * Finds the zones along a leg. What is 0 at an edge is a polynomial in the leg's free path, as a space acts linearly: of
 * degree 1, or at most 3 where a lens stays in the middle of the leg. A few walks give its coefficients, and walks near
 * each root make it exact.
 */
final class ZoneSearch {
    /** Roots that many lengths away are rounding of a coefficient that is 0. */
    private static final double FAR = 1e6;

    private static final int POLISH = 2;

    private final Trial now;
    private final Trial probe;
    private final int leg;
    private final double path;
    /** The unit of {@code x}, in which the path is varied, m. */
    private final double unit;

    private final int degree;

    ZoneSearch(Trial now, int leg) {
        this.now = now;
        this.probe = now.copy();
        this.leg = leg;
        path = now.pathOf(leg);
        unit = path;
        degree = hasLensInMiddle() ? 3 : 1;
    }

    private boolean hasLensInMiddle() {
        Chain chain = now.numbers.chain;
        for (int i = chain.mirror[leg] + 1; i < chain.end(leg); i++) {
            boolean focuses =
                    chain.kind[i] == Kind.LENS || chain.kind[i] == Kind.MATRIX || now.numbers.hasThermalLens(i);
            if (now.numbers.inMiddle[i] && focuses) {
                return true;
            }
        }
        return false;
    }

    Zones zones(Plane plane) {
        Chain chain = now.numbers.chain;
        double least = 0;
        for (int i = chain.mirror[leg] + 1; i < chain.end(leg); i++) {
            least += now.numbers.inside(i);
        }
        List<ZoneEdge> edges = new ArrayList<>();
        if (path > 0) {
            for (EdgeCause cause : EdgeCause.of(chain)) {
                int rank = 0;
                for (double x : roots(cause, plane)) {
                    edges.add(new ZoneEdge(cause, rank++, path + x * unit));
                }
            }
        }
        edges.sort(Comparator.comparingDouble(ZoneEdge::path));
        List<Zone> zones = path > 0 ? between(edges, plane) : List.of();
        Optional<Zone> here = now.hasBeam(plane)
                ? zones.stream().filter(z -> z.from() < path && path < z.to()).findFirst()
                : Optional.empty();
        return new Zones(plane, leg, path, least, edges, zones, here);
    }

    private double at(EdgeCause cause, Plane plane, double x) {
        probe.walk(leg, path + x * unit);
        return cause.of(probe, plane);
    }

    private List<Double> roots(EdgeCause cause, Plane plane) {
        double[] polynomial = polynomial(cause, plane);
        List<Double> roots = new ArrayList<>();
        for (double root : Polynomial.simpleRoots(polynomial, FAR)) {
            double x = root;
            for (int i = 0; i < POLISH; i++) {
                x -= at(cause, plane, x) / Polynomial.slope(polynomial, x);
            }
            roots.add(x);
        }
        return roots;
    }

    /** Coefficients in x, the lowest first; what may be rounding is 0. */
    private double[] polynomial(EdgeCause cause, Plane plane) {
        double zero = at(cause, plane, 0);
        double minus = at(cause, plane, -1);
        double plus = at(cause, plane, 1);
        double even = (plus + minus) / 2 - zero;
        double odd = (plus - minus) / 2;
        double rounding = Rounding.of(probe, cause, plane);
        if (degree == 1) {
            return new double[] {zero, significant(odd, rounding)};
        }
        double two = at(cause, plane, 2);
        double wider = Rounding.of(probe, cause, plane);
        double third = significant((two - zero - 4 * even - 2 * odd) / 6, wider);
        return new double[] {zero, significant(odd - third, wider), significant(even, wider), third};
    }

    private static double significant(double coefficient, double rounding) {
        return Math.abs(coefficient) > rounding ? coefficient : 0;
    }

    /** The stretches between edges in which the plane is stable. */
    private List<Zone> between(List<ZoneEdge> edges, Plane plane) {
        List<Zone> zones = new ArrayList<>();
        for (int i = 0; i <= edges.size(); i++) {
            Optional<ZoneEdge> lower = i > 0 ? Optional.of(edges.get(i - 1)) : Optional.empty();
            Optional<ZoneEdge> upper = i < edges.size() ? Optional.of(edges.get(i)) : Optional.empty();
            Zone zone = new Zone(lower, upper);
            probe.walk(leg, inside(zone));
            if (probe.hasBeam(plane)) {
                zones.add(zone);
            }
        }
        return zones;
    }

    private double inside(Zone zone) {
        if (zone.lower().isEmpty()) {
            return zone.upper().isEmpty() ? path : zone.to() - unit;
        }
        return zone.upper().isEmpty() ? zone.from() + unit : (zone.from() + zone.to()) / 2;
    }
}
