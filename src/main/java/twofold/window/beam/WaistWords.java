package twofold.window.beam;

import twofold.cavity.Waist;
import twofold.design.Unit;
import twofold.picture.BeamDrawing;

/** A waist's numbers in words, for hovering. */
final class WaistWords {
    private WaistWords() {}

    static String of(BeamDrawing.WaistDot dot) {
        Waist waist = dot.waist();
        return dot.plane().word() + " waist " + Unit.UM.shown(waist.radius()) + " µm\nat "
                + Unit.MM.shown(dot.path()) + " mm along the path\nRayleigh length "
                + Unit.MM.shown(waist.rayleigh()) + " mm";
    }
}
