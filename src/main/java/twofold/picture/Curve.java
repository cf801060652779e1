package twofold.picture;

import twofold.cavity.Waist;

/** Points of a beam's radius along a stretch: dense near a waist, where the hyperbola bends, and sparse elsewhere. */
final class Curve {
    /** How far a chord may be off the curve, px. */
    private static final double TOLERANCE = 0.12;

    /** The largest step in asinh of the path over the Rayleigh length. */
    private static final double LARGEST_STEP = 0.8;

    private Curve() {}

    /**
     * Adds points (path from the stretch's beginning, radius), both m. With z = zR sinh u the radius is w0 cosh u, and a
     * chord over Δu is off by at most w0 Δu²/8, measured along the radius.
     *
     * @param waist of the stretch
     * @param from path from the stretch's beginning, m
     * @param to path from the stretch's beginning, m
     * @param scale px per metre of radius
     * @param points takes them
     */
    static void sample(Waist waist, double from, double to, double scale, Points points) {
        double low = asinh((from - waist.after()) / waist.rayleigh());
        double high = asinh((to - waist.after()) / waist.rayleigh());
        double step = Math.min(LARGEST_STEP, Math.sqrt(8 * TOLERANCE / Math.max(1e-9, waist.radius() * scale)));
        int steps = (int) Math.min(400, Math.max(1, Math.ceil((high - low) / step)));
        for (int i = 0; i <= steps; i++) {
            double path = i == 0
                    ? from
                    : i == steps ? to : waist.after() + waist.rayleigh() * Math.sinh(low + (high - low) * i / steps);
            points.add(path, waist.radiusAt(path));
        }
    }

    private static double asinh(double x) {
        return Math.signum(x) * Math.log(Math.abs(x) + Math.hypot(1, x));
    }
}
