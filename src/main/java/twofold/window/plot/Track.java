package twofold.window.plot;

import twofold.design.Unit;
import twofold.study.Axis;

/** An axis of a picture under the pointer: from what is drawn there to a value that a person would type. */
record Track(Axis axis) {
    /** So many steps of a key lead from end to end. */
    private static final int STEPS = 200;

    /**
     * The value to set for one that was pointed at: the nearest of a list; else as round as the pointer is coarse.
     *
     * @param shown in the axis' unit
     * @param coarse what a pixel is, in that unit
     * @return in SI
     */
    double value(double shown, double coarse) {
        if (axis.isList()) {
            return axis.value(nearest(axis.unit().toSi(shown)));
        }
        Unit unit = axis.unit();
        double step = Math.pow(10, Math.floor(Math.log10(Math.max(Math.abs(coarse), 1e-12))));
        // As a decimal of that many places, so that 104.6 does not become 104.60000000000001.
        int places = (int) Math.max(0, -Math.round(Math.log10(step)));
        double round = Double.parseDouble(Unit.fixed(Math.rint(shown / step) * step, places));
        return within(unit.toSi(round));
    }

    private double within(double si) {
        return Math.max(axis.value(0), Math.min(axis.value(axis.size() - 1), si));
    }

    private int nearest(double si) {
        int best = 0;
        for (int i = 1; i < axis.size(); i++) {
            if (Math.abs(axis.value(i) - si) < Math.abs(axis.value(best) - si)) {
                best = i;
            }
        }
        return best;
    }

    /** A value some steps of a key away, in SI. */
    double moved(double si, int steps) {
        if (steps == 0) {
            return si;
        }
        if (axis.isList()) {
            return axis.value(Math.max(0, Math.min(axis.size() - 1, nearest(si) + Integer.signum(steps))));
        }
        Unit unit = axis.unit();
        double all = unit.fromSi(axis.value(axis.size() - 1)) - unit.fromSi(axis.value(0));
        double step = Math.pow(10, Math.floor(Math.log10(all / STEPS)));
        return value(unit.fromSi(si) + steps * step, step);
    }
}
