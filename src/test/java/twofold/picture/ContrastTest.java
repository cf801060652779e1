package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.cavity.Cavity;
import twofold.design.Design;

/**
 * Contrast of every pair of inks in use, by WCAG 2.2 (W3C, 2023): 1.4.3 asks 4.5 : 1 of text, 1.4.11 asks 3 : 1 of what
 * carries meaning. Here is the one list of which ink may stand on what.
 */
class ContrastTest {
    private static final double TEXT = 4.5;
    private static final double LINE = 3;

    /** What lies on paper, from below. */
    private record Coat(Ink ink, double alpha) {}

    private record Pair(Ink ink, double least, List<Coat> ground) {}

    private static final Coat RIBBON = new Coat(Ink.TANGENTIAL, BenchBeam.RIBBON);
    private static final Coat PAPER = new Coat(Ink.PAPER, 1);
    private static final Coat VEIL = new Coat(Ink.PAPER, Pane.VEIL);
    private static final Coat CRYSTAL = new Coat(Ink.CRYSTAL, 1);
    private static final Coat CRYSTAL_BAND = new Coat(Ink.CRYSTAL, 0.6);
    private static final Coat GLASS = new Coat(Ink.GLASS, 1);
    private static final Coat GLASS_BAND = new Coat(Ink.GLASS, 0.6);
    private static final Coat MOUNT = new Coat(Ink.MOUNT, 1);
    private static final Coat OPTIC_BAND = new Coat(Ink.OPTIC, 0.6);
    private static final Coat TINT_T = new Coat(Ink.TANGENTIAL, Halves.TINT);
    private static final Coat TINT_S = new Coat(Ink.SAGITTAL, Halves.TINT);

    private static final Coat BAND_T = new Coat(Ink.TANGENTIAL, SweepPanel.TINT);
    private static final Coat BAND_S = new Coat(Ink.SAGITTAL, SweepPanel.TINT);

    private static List<Pair> inUse() {
        List<Pair> pairs = new ArrayList<>();
        // Text on paper, and on the veil that lies over crossing beams, mounts and crystals behind it.
        for (Ink ink : List.of(Ink.TEXT, Ink.QUIET, Ink.CRYSTAL_EDGE, Ink.TANGENTIAL, Ink.SAGITTAL, Ink.BAD)) {
            add(pairs, ink, TEXT, PAPER);
            add(pairs, ink, TEXT, PAPER, RIBBON, RIBBON, VEIL);
            add(pairs, ink, TEXT, PAPER, CRYSTAL, RIBBON, VEIL);
            add(pairs, ink, TEXT, PAPER, MOUNT, RIBBON, VEIL);
        }
        // The page's title and facts, the scale bar's words where the beam runs below them.
        add(pairs, Ink.TEXT, TEXT, new Coat(Ink.DESK, 1));
        add(pairs, Ink.QUIET, TEXT, new Coat(Ink.DESK, 1));
        add(pairs, Ink.TEXT, TEXT, PAPER, RIBBON, RIBBON);
        // Numbers of waists, close to bands and tints.
        for (Coat band : List.of(CRYSTAL_BAND, GLASS_BAND)) {
            add(pairs, Ink.TANGENTIAL, LINE, PAPER, band, TINT_T);
            add(pairs, Ink.SAGITTAL, LINE, PAPER, band, TINT_S);
        }
        // The window's own.
        for (Ink ground : List.of(Ink.BAR, Ink.CONTROL, Ink.CONTROL_HOVER, Ink.SELECTED_ROW)) {
            add(pairs, Ink.TEXT, TEXT, new Coat(ground, 1));
            add(pairs, Ink.QUIET, TEXT, new Coat(ground, 1));
            add(pairs, Ink.BAD, TEXT, new Coat(ground, 1));
            add(pairs, Ink.FOCUS, LINE, new Coat(ground, 1));
        }
        add(pairs, Ink.GOOD, TEXT, PAPER);
        add(pairs, Ink.ON_ACCENT, TEXT, new Coat(Ink.ACCENT, 1));
        for (Ink ground : List.of(Ink.PAPER, Ink.DESK, Ink.BAR)) {
            add(pairs, Ink.ACCENT, LINE, new Coat(ground, 1));
            add(pairs, Ink.FOCUS, LINE, new Coat(ground, 1));
        }
        for (Ink ground : List.of(Ink.PAPER, Ink.DESK, Ink.CONTROL)) {
            add(pairs, Ink.CONTROL_EDGE, LINE, new Coat(ground, 1));
        }
        // Lines of beams and axis, where ribbons cross and inside crystals and plates.
        for (Ink ink : List.of(Ink.SAGITTAL, Ink.AXIS, Ink.SELECTED, Ink.CROSSHAIR)) {
            add(pairs, ink, LINE, PAPER);
            add(pairs, ink, LINE, PAPER, RIBBON, RIBBON);
            add(pairs, ink, LINE, PAPER, CRYSTAL, RIBBON);
            add(pairs, ink, LINE, PAPER, GLASS, RIBBON);
            add(pairs, ink, LINE, PAPER, MOUNT, RIBBON, RIBBON);
        }
        for (Coat band : List.of(PAPER, CRYSTAL_BAND, GLASS_BAND, OPTIC_BAND)) {
            add(pairs, Ink.TANGENTIAL, LINE, PAPER, band);
            add(pairs, Ink.SAGITTAL, LINE, PAPER, band);
            add(pairs, Ink.AXIS, LINE, PAPER, band);
            add(pairs, Ink.CROSSHAIR, LINE, PAPER, band);
        }
        // The bars of stability on their track.
        add(pairs, Ink.TANGENTIAL, LINE, MOUNT);
        add(pairs, Ink.SAGITTAL, LINE, MOUNT);
        add(pairs, Ink.AXIS, LINE, MOUNT);
        // Zones on their strip and in a sweep's panels, with both planes' tints over one another.
        for (Coat ground : List.of(PAPER, MOUNT)) {
            for (Ink ink : List.of(Ink.TANGENTIAL, Ink.SAGITTAL, Ink.AXIS, Ink.TEXT, Ink.SELECTED, Ink.CROSSHAIR)) {
                add(pairs, ink, LINE, ground);
            }
        }
        Coat both = new Coat(Ink.GOOD, ZoneStripDrawing.BOTH);
        for (Ink own : List.of(Ink.TANGENTIAL, Ink.SAGITTAL)) {
            Coat tint = new Coat(own, ZoneStripDrawing.TINT);
            for (Ink ink : List.of(own, Ink.TEXT, Ink.AXIS)) {
                add(pairs, ink, LINE, MOUNT, tint);
                add(pairs, ink, LINE, MOUNT, tint, both);
            }
        }
        for (Ink ink : List.of(Ink.TANGENTIAL, Ink.SAGITTAL, Ink.TEXT, Ink.SELECTED, Ink.CROSSHAIR, Ink.AXIS)) {
            add(pairs, ink, LINE, PAPER, BAND_T, BAND_S);
        }
        for (Ink ink : List.of(Ink.TANGENTIAL, Ink.SAGITTAL, Ink.TEXT)) {
            add(pairs, ink, TEXT, PAPER, BAND_T, BAND_S, VEIL);
        }
        // The stable regions of the diagram of standing waves.
        for (Ink ink : List.of(Ink.TANGENTIAL, Ink.SAGITTAL, Ink.AXIS)) {
            add(pairs, ink, LINE, MOUNT, new Coat(Ink.GOOD, GDiagramDrawing.TINT));
        }
        // Outlines of the ledger's bars.
        add(pairs, Ink.TEXT, LINE, PAPER, new Coat(Ink.TEXT, LedgerDrawing.TINT));
        // Outlines of parts, on table and mount, with the beam over them.
        add(pairs, Ink.OPTIC_EDGE, LINE, PAPER, RIBBON, RIBBON);
        add(pairs, Ink.OPTIC_EDGE, LINE, PAPER);
        add(pairs, Ink.OPTIC_EDGE, LINE, MOUNT, RIBBON);
        add(pairs, Ink.OPTIC_EDGE, LINE, MOUNT);
        add(pairs, Ink.CRYSTAL_EDGE, LINE, PAPER);
        add(pairs, Ink.CRYSTAL_EDGE, LINE, PAPER, RIBBON, RIBBON);
        add(pairs, Ink.CRYSTAL_EDGE, LINE, PAPER, CRYSTAL_BAND, TINT_T);
        add(pairs, Ink.MOUNT_EDGE, LINE, PAPER);
        add(pairs, Ink.QUIET, LINE, PAPER);
        add(pairs, Ink.BAD, LINE, PAPER);
        return pairs;
    }

    private static void add(List<Pair> pairs, Ink ink, double least, Coat... ground) {
        pairs.add(new Pair(ink, least, List.of(ground)));
    }

    @ParameterizedTest
    @EnumSource(Theme.class)
    void everyPairInUseHasContrast(Theme theme) {
        List<String> weak = new ArrayList<>();
        for (Pair pair : inUse()) {
            double ratio = ratio(linear(theme, List.of(new Coat(pair.ink(), 1))), linear(theme, pair.ground()));
            if (ratio < pair.least()) {
                weak.add(String.format(
                        java.util.Locale.ROOT,
                        "%s on %s: %.2f < %.1f",
                        pair.ink(),
                        pair.ground(),
                        ratio,
                        pair.least()));
            }
        }
        assertThat(weak)
                .as("pairs below their contrast in the %s theme", theme.word())
                .isEmpty();
    }

    @ParameterizedTest
    @EnumSource(Theme.class)
    void numbersOnAMapsColoursHaveContrastOnTheirPlates(Theme theme) {
        double text = linear(theme, List.of(new Coat(Ink.TEXT, 1)));
        for (int colour = 0; colour < ColourMap.SIZE; colour++) {
            double[] rgb = new double[3];
            for (int i = 0; i < 3; i++) {
                int under = ColourMap.rgb(colour) >> (16 - 8 * i) & 0xff;
                int paper = theme.rgb(Ink.PAPER) >> (16 - 8 * i) & 0xff;
                rgb[i] = under + Pane.VEIL * (paper - under);
            }
            assertThat(ratio(text, luminance(rgb))).as("colour %d", colour).isGreaterThanOrEqualTo(TEXT);
        }
    }

    @ParameterizedTest
    @EnumSource(Theme.class)
    void linesOverAMapsColoursHaveContrastToTheirCasing(Theme theme) {
        // The casing's opacity over whichever colour is the worst.
        for (Ink ink : List.of(Ink.TANGENTIAL, Ink.SAGITTAL, Ink.TEXT, Ink.SELECTED, Ink.CROSSHAIR)) {
            double line = linear(theme, List.of(new Coat(ink, 1)));
            for (int colour = 0; colour < ColourMap.SIZE; colour++) {
                double[] rgb = new double[3];
                for (int i = 0; i < 3; i++) {
                    int under = ColourMap.rgb(colour) >> (16 - 8 * i) & 0xff;
                    int paper = theme.rgb(Ink.PAPER) >> (16 - 8 * i) & 0xff;
                    rgb[i] = under + MapOutlines.CASING * (paper - under);
                }
                assertThat(ratio(line, luminance(rgb)))
                        .as("%s on colour %d", ink, colour)
                        .isGreaterThanOrEqualTo(LINE);
            }
        }
    }

    @ParameterizedTest
    @EnumSource(Theme.class)
    void theFormulaGivesItsKnownEnds(Theme theme) {
        // WCAG 2.2, definition of contrast ratio: 21 for black on white, 1 for a colour on itself.
        assertThat(ratio(luminance(new double[] {0, 0, 0}), luminance(new double[] {255, 255, 255})))
                .isEqualTo(21);
        double some = linear(theme, List.of(new Coat(Ink.TANGENTIAL, 1)));
        assertThat(ratio(some, some)).isEqualTo(1);
    }

    @ParameterizedTest
    @EnumSource(Theme.class)
    void drawingsUseNoInkThatIsNotListed(Theme theme) {
        Set<Ink> texts = EnumSet.noneOf(Ink.class);
        Set<Ink> lines = EnumSet.noneOf(Ink.class);
        for (Design design : ReadableTest.designs().toList()) {
            Recorder r = new Recorder();
            Cavity cavity = Drawn.solved(design);
            Sheet.draw(cavity, r, 1280, 800, OptionalDouble.empty());
            BenchDrawing bench = new BenchDrawing(cavity);
            bench.draw(r, bench.all(800, 400).selecting(OptionalInt.of(1)).crossing(OptionalDouble.of(0.1)));
            BeamDrawing beam = new BeamDrawing(cavity);
            beam.draw(r, beam.all(800, 400).selecting(OptionalInt.of(1)).crossing(OptionalDouble.of(0.1)));
            Plots.drawings(cavity).forEach(d -> d.draw(r, 560, 420));
            r.drawn(Recorder.Mark.TEXT).forEach(t -> texts.add(t.stroke().ink()));
            r.drawn(Recorder.Mark.LINE).forEach(t -> lines.add(t.stroke().ink()));
        }
        // Rules between panes and along axis numbers carry no meaning that the numbers do not.
        lines.remove(Ink.RULE);
        // Casings set lines off from a map's colours.
        lines.remove(Ink.PAPER);
        assertThat(listed(TEXT, theme)).containsAll(texts);
        assertThat(listed(LINE, theme)).containsAll(lines);
    }

    private static Set<Ink> listed(double least, Theme theme) {
        Set<Ink> inks = EnumSet.noneOf(Ink.class);
        inUse().stream()
                .filter(p -> p.least() >= least && theme.rgb(p.ink()) >= 0)
                .forEach(p -> inks.add(p.ink()));
        return inks;
    }

    /** The luminance of coats over one another. */
    private static double linear(Theme theme, List<Coat> coats) {
        double[] rgb = new double[3];
        for (Coat coat : coats) {
            for (int i = 0; i < 3; i++) {
                int channel = theme.rgb(coat.ink()) >> (16 - 8 * i) & 0xff;
                rgb[i] += coat.alpha() * (channel - rgb[i]);
            }
        }
        return luminance(rgb);
    }

    private static double luminance(double[] rgb) {
        double[] weights = {0.2126, 0.7152, 0.0722};
        double sum = 0;
        for (int i = 0; i < 3; i++) {
            double c = rgb[i] / 255;
            sum += weights[i] * (c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4));
        }
        return sum;
    }

    private static double ratio(double a, double b) {
        return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
    }
}
