package twofold.picture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import twofold.cavity.Ledger;
import twofold.design.Edge;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.layout.Laid;

/**
 * Where the astigmatism comes from: each part's share of a zone edge's split as a bar about a zero line, negative to the
 * left, with its length in words; below them the sum, the true split and what the shares leave of it.
 */
public final class LedgerDrawing {
    /** Opacity of a bar within its outline. */
    static final double TINT = 0.45;

    private static final double RIM = 14;
    private static final double ROW = 20;
    private static final double BAR = 11;
    private static final double FIRST = 58;

    private final Laid laid;
    private final Optional<Ledger> ledger;
    private final Edge edge;
    private final Points points = new Points();

    /**
     * A drawing of a ledger.
     *
     * @param laid the plan that it belongs to
     * @param ledger empty where there is none
     * @param edge which edge was asked for
     */
    public LedgerDrawing(Laid laid, Optional<Ledger> ledger, Edge edge) {
        this.laid = laid;
        this.ledger = ledger;
        this.edge = edge;
    }

    /** The least height that shows every part, px. */
    public double height() {
        return FIRST + ROW * (ledger.map(l -> l.shares().size()).orElse(0) + 3);
    }

    private record Row(String name, double length, Ink ink) {
        Type type() {
            return ink == Ink.TEXT ? Type.STRONG : Type.BODY;
        }
    }

    /** Draws it in a pane, px. In less height than it takes, the smallest shares are drawn as one. */
    public void draw(Painter painter, double width, double height) {
        painter.push(0, 0, width, height);
        Pane.paper(painter, width, height, points);
        double room = width - 2 * RIM;
        String title = "Where the astigmatism comes from";
        String fits = Lettering.width(title, Type.TITLE) <= room ? title : "Astigmatism ledger";
        painter.text(Lettering.cut(fits, Type.TITLE, room), RIM, Pane.BASE, Type.TITLE, Ink.TEXT, Anchor.START);
        if (ledger.isEmpty()) {
            none(painter, room);
        } else {
            table(painter, ledger.get(), width, height);
        }
        painter.pop();
    }

    private void none(Painter painter, double room) {
        double y = 42;
        List<String> words = List.of(
                "No ledger: along this leg the sagittal plane",
                "has no zone with a " + edge.word() + " edge that the",
                "tangential plane has too.");
        for (String line : words) {
            painter.text(Lettering.cut(line, Type.BODY, room), RIM, y, Type.BODY, Ink.TEXT, Anchor.START);
            y += 16;
        }
    }

    private void table(Painter painter, Ledger l, double width, double height) {
        List<Part> parts = laid.design().parts();
        String leg = parts.get(laid.legs().get(l.leg()).from()).name() + " to "
                + parts.get(laid.legs().get(l.leg()).to()).name();
        String note = "split of the " + l.edge().word() + " zone edge, " + leg;
        painter.text(
                Lettering.cut(note, Type.SMALL, width - 2 * RIM),
                RIM,
                Pane.BASE + 17,
                Type.SMALL,
                Ink.QUIET,
                Anchor.START);
        List<Row> shares = shares(l, parts, (int) Math.max(1, Math.floor((height - FIRST) / ROW) - 3));
        List<Row> sums = List.of(
                new Row("sum", l.sum(), Ink.AXIS),
                new Row("true split, T − S", l.split(), Ink.TEXT),
                new Row("remainder", l.remainder(), Ink.AXIS));
        List<Row> all = new ArrayList<>(shares);
        all.addAll(sums);
        double figures = 0;
        double names = 0;
        double largest = 0;
        for (Row row : all) {
            figures = Math.max(figures, Lettering.width(said(row.length()), row.type()));
            names = Math.max(names, Lettering.width(row.name(), row.type()));
            largest = Math.max(largest, Double.isNaN(row.length()) ? 0 : Math.abs(row.length()));
        }
        double right = width - RIM - figures - 10;
        double left = RIM + Math.min(names, 0.42 * width) + 10;
        double zero = (left + right) / 2;
        double scale = largest > 0 ? (right - left) / 2 / largest : 0;
        double y = FIRST;
        for (int i = 0; i < all.size(); i++) {
            Row row = all.get(i);
            if (i == shares.size()) {
                painter.line(RIM, y - 14.5, width - RIM, y - 14.5, Stroke.of(Ink.RULE, 1));
            }
            painter.text(
                    Lettering.cut(row.name(), row.type(), left - RIM - 6), RIM, y, row.type(), Ink.TEXT, Anchor.START);
            painter.text(said(row.length()), width - RIM, y, row.type(), Ink.TEXT, Anchor.END);
            bar(painter, row, zero, y - 4.5, scale);
            y += ROW;
        }
        painter.line(zero, FIRST - 13, zero, y - ROW + 5, Stroke.of(Ink.AXIS, 1.2));
    }

    private void bar(Painter painter, Row row, double zero, double middle, double scale) {
        double length = Double.isNaN(row.length()) ? 0 : row.length() * scale;
        if (Math.abs(length) >= 0.5) {
            Pane.rectangle(points, Math.min(zero, zero + length), middle - BAR / 2, Math.abs(length), BAR);
            painter.polygon(points, row.ink(), TINT);
            painter.polyline(points, true, Stroke.of(row.ink(), 1.2));
        }
    }

    /** "−0.954 mm": to a micrometre, as a share is turned on a micrometer. */
    private static String said(double metres) {
        if (Double.isNaN(metres)) {
            return "undefined";
        }
        String text = Figures.fixed(metres * 1e3, 3);
        return (metres > 0 && !text.equals("0.000") ? "+" : "") + text + " mm";
    }

    /** At the most so many rows; where that is too few, the smallest shares make one. */
    private static List<Row> shares(Ledger l, List<Part> parts, int most) {
        List<Ledger.Share> shares = l.shares();
        if (shares.size() <= most) {
            return shares.stream().map(s -> row(s, parts)).toList();
        }
        List<Ledger.Share> kept = shares.stream()
                .sorted(Comparator.comparingDouble((Ledger.Share s) -> -Math.abs(s.length())))
                .limit(most - 1L)
                .toList();
        List<Row> rows = new ArrayList<>(
                shares.stream().filter(kept::contains).map(s -> row(s, parts)).toList());
        double rest = shares.stream()
                .filter(s -> !kept.contains(s))
                .mapToDouble(Ledger.Share::length)
                .sum();
        int others = shares.size() - kept.size();
        rows.add(new Row(others + (kept.isEmpty() ? " parts together" : " more parts"), rest, Ink.QUIET));
        return rows;
    }

    private static Row row(Ledger.Share share, List<Part> parts) {
        Part part = parts.get(share.part());
        Ink ink = part.kind() == Kind.CRYSTAL ? Ink.CRYSTAL_EDGE : Ink.OPTIC_EDGE;
        return new Row(part.name(), share.length(), ink);
    }
}
