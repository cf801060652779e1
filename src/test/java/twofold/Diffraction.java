package twofold;

import java.util.ArrayList;
import java.util.List;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.Mirror;
import twofold.design.TiltPlane;
import twofold.layout.Laid;
import twofold.layout.Leg;
import twofold.layout.Standing;
import twofold.optics.Plane;

/**
 * Scalar light of one transverse dimension, sent through a standing wave of mirrors and crystals without inner lenses step by step: the
 * Huygens-Fresnel integral over every free path in its own medium, every mirror a phase screen, every tilted face a
 * stretch of the wave. Nothing of the program is used but lengths and angles of the plan, and no ray matrix at all.
 *
 * <p>Phases run as exp(+ikz): a diverging wavefront has exp(+iπx²/(λR)).
 */
final class Diffraction {
    private final double wavelength;
    private final List<Step> steps = new ArrayList<>();

    /** One thing that happens to a field on the way forward, and on the way back. */
    private interface Step {
        Wave pass(Wave wave, boolean back);
    }

    Diffraction(Laid laid, Plane plane) {
        Design design = laid.design();
        wavelength = design.wavelength();
        int last = laid.legs().get(laid.legs().size() - 1).to();
        for (Leg leg : laid.legs()) {
            double done = 0;
            for (Standing s : leg.parts()) {
                space(s.start() - done, 1);
                crystal((Crystal) design.parts().get(s.part()), s, plane);
                done = s.end();
            }
            space(leg.path() - done, 1);
            double cos = Math.cos(laid.incidence().getOrDefault(leg.to(), Double.NaN));
            double curvature = ((Mirror) design.parts().get(leg.to())).curvature();
            if (leg.to() != last) {
                screen(2 * curvature * (plane == Plane.TANGENTIAL ? 1 / cos : cos));
            }
        }
    }

    private void space(double path, double index) {
        steps.add((wave, back) -> wave.gone(path, wavelength / index));
    }

    private void screen(double power) {
        steps.add((wave, back) -> wave.screened(-power, wavelength));
    }

    private void stretch(double by) {
        steps.add((wave, back) -> wave.stretched(back ? 1 / by : by));
    }

    /** A face stretches the field in the plane of its tilt by the ratio of the cosines, as a footprint is common to both. */
    private void crystal(Crystal crystal, Standing s, Plane plane) {
        boolean within = (crystal.slab().tiltPlane() == TiltPlane.TANGENTIAL) == (plane == Plane.TANGENTIAL);
        double inner = Math.asin(Math.sin(s.incidence()) / s.index());
        double by = within ? Math.cos(inner) / Math.cos(s.incidence()) : 1;
        stretch(by);
        space(s.length(), s.index());
        stretch(1 / by);
    }

    /** A Gaussian of a radius and wavefront curvature on a grid that fits it. */
    Wave gaussian(double radius, double curvature) {
        return Wave.gaussian(radius).screened(curvature, wavelength);
    }

    /** A Gaussian of a radius and wavefront curvature on the grid of another wave. */
    Wave gaussian(double radius, double curvature, Wave like) {
        return Wave.gaussian(radius, like.step()).screened(curvature, wavelength);
    }

    /** Once through a standing wave between flat end mirrors and back. */
    Wave roundTrip(Wave start) {
        Wave wave = start;
        for (Step step : steps) {
            wave = step.pass(wave, false);
        }
        for (int i = steps.size() - 1; i >= 0; i--) {
            wave = steps.get(i).pass(wave, true);
        }
        return wave;
    }
}
