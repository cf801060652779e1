package twofold.cavity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.Lens;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Shape;
import twofold.optics.Plane;

/**
 * A chain evaluated with 60 digits from the doubles of a design: mirrors, untilted lenses and crystals at normal incidence,
 * multiplied out there and back, with none of the program's formulas for edges. Independent arithmetic for tests.
 */
final class ManyDigits {
    private static final MathContext DIGITS = new MathContext(60);
    private static final BigDecimal TWO = BigDecimal.valueOf(2);

    private BigDecimal a = BigDecimal.ONE;
    private BigDecimal b = BigDecimal.ZERO;
    private BigDecimal c = BigDecimal.ZERO;
    private BigDecimal d = BigDecimal.ONE;

    private ManyDigits() {}

    /** The round trip from the surface of the first mirror, light leaving it. */
    static ManyDigits of(Design design, Plane plane) {
        ManyDigits trip = new ManyDigits();
        List<Part> parts = new ArrayList<>(design.parts());
        List<Mirror> mirrors = design.mirrors();
        boolean ring = design.shape() == Shape.RING;
        int n = parts.size();
        int at = 0;
        int steps = ring ? n : 2 * (n - 1);
        BigDecimal done = BigDecimal.ZERO;
        for (int step = 1; step <= steps; step++) {
            int index = ring ? step % n : step < n ? step : 2 * (n - 1) - step;
            boolean back = !ring && step >= n;
            Part part = parts.get(index);
            if (part instanceof Mirror m) {
                int next = mirrors.indexOf(m);
                BigDecimal whole = distance(mirrors.get(at), m);
                trip.space(whole.subtract(done, DIGITS));
                trip.mirror(m, design, mirrors, next, plane);
                at = next;
                done = BigDecimal.ZERO;
                continue;
            }
            BigDecimal along = along(part);
            if (back) {
                int to = at - 1;
                along = distance(mirrors.get(at), mirrors.get(to)).subtract(along);
            }
            if (part instanceof Lens l) {
                trip.space(along.subtract(done, DIGITS));
                trip.lens(BigDecimal.ONE.divide(new BigDecimal(l.focalLength()), DIGITS));
                done = along;
            } else if (part instanceof Crystal x) {
                BigDecimal half = new BigDecimal(x.length()).divide(TWO, DIGITS);
                BigDecimal index1 = new BigDecimal(x.slab().glass().index().orElseThrow());
                trip.space(along.subtract(half).subtract(done, DIGITS));
                trip.space(half.multiply(TWO).divide(index1, DIGITS));
                done = along.add(half);
            } else {
                throw new IllegalArgumentException("not covered: " + part);
            }
        }
        return trip;
    }

    private static BigDecimal along(Part part) {
        return new BigDecimal(
                part instanceof Lens l
                        ? l.along().path()
                        : ((Crystal) part).slab().along().path());
    }

    /** A leg's path: what stands on it does so at normal incidence. */
    private static BigDecimal distance(Mirror from, Mirror to) {
        BigDecimal dx =
                new BigDecimal(to.at().x()).subtract(new BigDecimal(from.at().x()));
        BigDecimal dy =
                new BigDecimal(to.at().y()).subtract(new BigDecimal(from.at().y()));
        return dx.multiply(dx).add(dy.multiply(dy)).sqrt(DIGITS);
    }

    private void mirror(Mirror m, Design design, List<Mirror> mirrors, int k, Plane plane) {
        if (Double.isInfinite(m.radius())) {
            return;
        }
        BigDecimal power = TWO.divide(new BigDecimal(m.radius()), DIGITS);
        boolean end = design.shape() == Shape.STANDING_WAVE && (k == 0 || k == mirrors.size() - 1);
        if (!end) {
            int count = mirrors.size();
            BigDecimal cos = cosIncidence(mirrors.get((k + count - 1) % count), m, mirrors.get((k + 1) % count));
            power = plane == Plane.TANGENTIAL ? power.divide(cos, DIGITS) : power.multiply(cos, DIGITS);
        }
        lens(power);
    }

    private static BigDecimal cosIncidence(Mirror before, Mirror m, Mirror after) {
        BigDecimal ux =
                new BigDecimal(m.at().x()).subtract(new BigDecimal(before.at().x()));
        BigDecimal uy =
                new BigDecimal(m.at().y()).subtract(new BigDecimal(before.at().y()));
        BigDecimal vx = new BigDecimal(after.at().x()).subtract(new BigDecimal(m.at().x()));
        BigDecimal vy = new BigDecimal(after.at().y()).subtract(new BigDecimal(m.at().y()));
        BigDecimal lengths = ux.multiply(ux)
                .add(uy.multiply(uy))
                .multiply(vx.multiply(vx).add(vy.multiply(vy)))
                .sqrt(DIGITS);
        BigDecimal cosine = ux.multiply(vx).add(uy.multiply(vy)).divide(lengths, DIGITS);
        return BigDecimal.ONE.subtract(cosine).divide(TWO, DIGITS).sqrt(DIGITS);
    }

    private void space(BigDecimal length) {
        a = a.add(length.multiply(c), DIGITS);
        b = b.add(length.multiply(d), DIGITS);
    }

    private void lens(BigDecimal power) {
        c = c.subtract(power.multiply(a), DIGITS);
        d = d.subtract(power.multiply(b), DIGITS);
    }

    /** 1 − |(a + d)/2|. */
    BigDecimal margin() {
        return BigDecimal.ONE.subtract(a.add(d).divide(TWO, DIGITS).abs());
    }

    /** w² π/λ at the first mirror: |b|/√(1 − h²). */
    BigDecimal squaredRadius() {
        BigDecimal h = a.add(d).divide(TWO, DIGITS);
        return b.abs().divide(BigDecimal.ONE.subtract(h.multiply(h)).sqrt(DIGITS), DIGITS);
    }
}
