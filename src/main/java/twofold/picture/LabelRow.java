package twofold.picture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Labels side by side, each as near as can be to its place; the longest wording that fits all is used. */
final class LabelRow {
    private static final double GAP = 8;

    private record Label(double x, List<String> wordings, double rank) {}

    private final List<Label> labels = new ArrayList<>();

    /**
     * Adds a label.
     *
     * @param x of what it names, px
     * @param wordings the longest first
     * @param rank what goes first where not all fit: the largest
     */
    void add(double x, List<String> wordings, double rank) {
        labels.add(new Label(x, wordings, rank));
    }

    /** Writes them on a baseline between two limits, px, with a tie from each to its place. */
    void draw(Painter painter, double left, double right, double base, double tie, Ink ink) {
        List<Label> shown = new ArrayList<>(labels);
        shown.sort(Comparator.comparingDouble(Label::x));
        while (!shown.isEmpty()) {
            int most = shown.stream().mapToInt(l -> l.wordings().size()).max().orElse(0);
            for (int wording = 0; wording < most; wording++) {
                if (draws(painter, shown, wording, left, right, base, tie, ink)) {
                    return;
                }
            }
            shown.remove(
                    shown.stream().min(Comparator.comparingDouble(Label::rank)).orElseThrow());
        }
    }

    private static boolean draws(
            Painter painter,
            List<Label> shown,
            int wording,
            double left,
            double right,
            double base,
            double tie,
            Ink ink) {
        String[] words = new String[shown.size()];
        double[] sizes = new double[words.length];
        double[] wishes = new double[words.length];
        for (int i = 0; i < words.length; i++) {
            List<String> all = shown.get(i).wordings();
            words[i] = all.get(Math.min(wording, all.size() - 1));
            sizes[i] = Lettering.width(words[i], Type.SMALL);
            wishes[i] = shown.get(i).x();
        }
        double[] middles = Spread.apart(wishes, sizes, GAP, left, right);
        if (middles.length == 0) {
            return false;
        }
        for (int i = 0; i < words.length; i++) {
            // A label that left its place would name another's.
            if (Math.abs(middles[i] - wishes[i]) > sizes[i] / 2 + 4) {
                return false;
            }
        }
        double near = tie > base ? base + 3 : base - Lettering.capital(Type.SMALL) - 3;
        for (int i = 0; i < words.length; i++) {
            painter.text(words[i], middles[i], base, Type.SMALL, ink, Anchor.MIDDLE);
            double from = Math.min(Math.max(wishes[i], middles[i] - sizes[i] / 2), middles[i] + sizes[i] / 2);
            painter.line(from, near, wishes[i], tie, Stroke.of(ink, 1));
        }
        return true;
    }
}
