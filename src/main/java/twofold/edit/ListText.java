package twofold.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import twofold.design.Entry;
import twofold.design.Field;
import twofold.design.Names;
import twofold.design.Subject;
import twofold.design.Turn;

/**
 * The numbers of a typed list with their places in the text; see {@link FromList} for its grammar.
 *
 * @param legs m
 * @param angles of incidence, rad, not negative
 * @param radii m, +∞ flat
 * @param faults what is wrong; the numbers are complete only without
 */
record ListText(List<Entered> legs, List<Entered> angles, List<Entered> radii, List<FromList.Fault> faults) {
    private static final int MOST_GROUPS = 3;
    private static final Pattern TURNED = Pattern.compile(
            "(?<before>left|right|l|r)?\\s*(?<number>.*?)\\s*(?<behind>left|right|l|r)?",
            Pattern.CASE_INSENSITIVE | Pattern.DOTALL);

    /**
     * One number.
     *
     * @param from index of its first character
     * @param to index behind its last character
     * @param si in SI
     * @param turn of an angle that states it
     */
    record Entered(int from, int to, double si, Optional<Turn> turn) {}

    /** A stretch of the text without spaces at its ends. */
    private record Piece(int from, int to, String text) {}

    static ListText of(String text) {
        List<FromList.Fault> faults = new ArrayList<>();
        List<Piece> groups = split(text, new Piece(0, text.length(), text), ';');
        for (int i = MOST_GROUPS; i < groups.size(); i++) {
            Piece more = groups.get(i);
            faults.add(new FromList.Fault(
                    more.from(), more.to(), "found a fourth group", "legs; angles of incidence; radii, and no more"));
        }
        List<Entered> legs = new ArrayList<>();
        for (Piece piece : elements(text, groups, 0)) {
            number(piece, piece.text(), Field.LEG, Optional.empty(), faults).ifPresent(legs::add);
        }
        List<Entered> angles = new ArrayList<>();
        for (Piece piece : elements(text, groups, 1)) {
            angle(piece, faults).ifPresent(angles::add);
        }
        List<Entered> radii = new ArrayList<>();
        for (Piece piece : elements(text, groups, 2)) {
            number(piece, piece.text(), Field.ROC, Optional.empty(), faults).ifPresent(radii::add);
        }
        if (faults.isEmpty()) {
            counts(text, groups, legs, angles, radii, faults);
        }
        return new ListText(legs, angles, radii, faults);
    }

    private static void counts(
            String text,
            List<Piece> groups,
            List<Entered> legs,
            List<Entered> angles,
            List<Entered> radii,
            List<FromList.Fault> faults) {
        if (legs.isEmpty()) {
            faults.add(new FromList.Fault(0, text.length(), "found no leg", "at least one length"));
            return;
        }
        int count = legs.size();
        boolean ring = angles.size() == count && count >= 3;
        if (!ring && angles.size() != count - 1) {
            Piece at = groups.get(Math.min(1, groups.size() - 1));
            faults.add(new FromList.Fault(
                    at.from(),
                    at.to(),
                    "found " + counted(angles.size(), "angle") + " for " + counted(count, "leg"),
                    (count - 1) + " for a standing wave"
                            + (count >= 3 ? ", or " + count + " for a ring" : "; a ring has three legs at least")));
            return;
        }
        int mirrors = ring ? count : count + 1;
        int folds = angles.size();
        if (!radii.isEmpty() && radii.size() != 1 && radii.size() != folds && radii.size() != mirrors) {
            Piece at = groups.get(2);
            faults.add(new FromList.Fault(
                    at.from(),
                    at.to(),
                    "found " + counted(radii.size(), "radius"),
                    "1 for every fold" + (ring || folds < 2 ? "" : ", " + folds + " for the folds") + ", or " + mirrors
                            + " for all mirrors"));
        }
    }

    private static String counted(int count, String what) {
        return count + " " + (count == 1 ? what : what.equals("radius") ? "radii" : what + "s");
    }

    private static List<Piece> elements(String text, List<Piece> groups, int group) {
        return group >= groups.size() || groups.get(group).text().isEmpty()
                ? List.of()
                : split(text, groups.get(group), ',');
    }

    private static List<Piece> split(String text, Piece whole, char by) {
        List<Piece> pieces = new ArrayList<>();
        int from = whole.from();
        for (int i = from; i <= whole.to(); i++) {
            if (i == whole.to() || text.charAt(i) == by) {
                pieces.add(stripped(text, from, i));
                from = i + 1;
            }
        }
        return pieces;
    }

    private static Piece stripped(String text, int from, int to) {
        int a = from;
        int b = to;
        while (a < b && Character.isWhitespace(text.charAt(a))) {
            a++;
        }
        while (b > a && Character.isWhitespace(text.charAt(b - 1))) {
            b--;
        }
        return new Piece(a, b, text.substring(a, b));
    }

    private static Optional<Entered> number(
            Piece piece, String text, Field field, Optional<Turn> turn, List<FromList.Fault> faults) {
        Entry<Object> entry = Entry.field(Subject.DOCUMENT, text, field);
        entry.problem()
                .ifPresent(p -> faults.add(new FromList.Fault(piece.from(), piece.to(), p.found(), p.accepted())));
        return entry.value().map(n -> new Entered(piece.from(), piece.to(), (Double) n, turn));
    }

    private static Optional<Entered> angle(Piece piece, List<FromList.Fault> faults) {
        Matcher turned = TURNED.matcher(piece.text());
        String bare = turned.matches() ? turned.group("number") : piece.text();
        List<Turn> turns = new ArrayList<>();
        if (turned.matches()) {
            word(turned.group("before")).ifPresent(turns::add);
            word(turned.group("behind")).ifPresent(turns::add);
        }
        boolean negative = bare.startsWith("-") || bare.startsWith("−");
        if (negative || bare.startsWith("+")) {
            turns.add(negative ? Turn.RIGHT : Turn.LEFT);
        }
        if (turns.size() > 1) {
            faults.add(new FromList.Fault(
                    piece.from(),
                    piece.to(),
                    "found \"" + Names.shown(piece.text()) + "\", a turn stated twice",
                    "a sign, L or R"));
            return Optional.empty();
        }
        String unsigned = bare.replaceFirst("^[-+−]", "");
        return number(piece, unsigned, Field.INCIDENCE, turns.stream().findFirst(), faults);
    }

    private static Optional<Turn> word(@org.jspecify.annotations.Nullable String word) {
        return word == null || word.isEmpty()
                ? Optional.empty()
                : Optional.of(word.toLowerCase(Locale.ROOT).startsWith("l") ? Turn.LEFT : Turn.RIGHT);
    }
}
