package twofold.picture;

import java.util.List;
import java.util.Optional;
import twofold.cavity.CrystalLine;
import twofold.cavity.Waist;
import twofold.optics.Plane;

/**
 * What a close-up says of one plane in two lines, each from its longest wording to its shortest.
 *
 * @param where the waist's radius and place, without the plane's name
 * @param further what follows from it
 */
record CloseUpWords(List<String> where, List<String> further) {
    /** A move that would show as 0.00 mm, m. */
    private static final double NOTHING = 0.005e-3;

    /** Copies the lists. */
    CloseUpWords {
        where = List.copyOf(where);
        further = List.copyOf(further);
    }

    /** For a slab of a length, m. */
    static CloseUpWords of(CrystalLine whole, double length, String name) {
        Optional<CrystalLine> behind = whole.afterLens();
        boolean second = behind.isPresent() && behind.get().inside() && !whole.inside();
        CrystalLine line = second ? behind.orElseThrow() : whole;
        String half = behind.isEmpty() ? "" : second ? ", behind its lens" : ", before its lens";
        String radius = Figures.um(line.radius());
        String off = Figures.mm(line.offset());
        String rayleighs = off + " (" + Figures.ratio(line.offset() / line.rayleigh()) + " zR)";
        List<String> where = line.inside()
                ? List.of(
                        "waist " + radius + ", " + rayleighs + " from its middle" + half,
                        "waist " + radius + ", " + rayleighs,
                        radius + ", " + rayleighs,
                        radius + ", " + off)
                : List.of(
                        "waist " + radius + ", outside: " + rayleighs + " from its middle" + half,
                        "waist " + radius + ", outside: " + rayleighs,
                        radius + ", outside: " + off,
                        radius + ", " + off);
        boolean centred = Math.abs(line.shiftToCentre()) < NOTHING;
        String move = Figures.mm(line.shiftToCentre());
        String zR = Figures.mm(line.rayleigh());
        String times = zR + ", " + Figures.times(line.rayleigh() / length) + " its length";
        String full = centred ? "centred" : "to centre it, move " + name + " " + move;
        String brief = centred ? "centred" : "move it " + move;
        return new CloseUpWords(
                where,
                List.of(
                        full + "; Rayleigh length " + times,
                        brief + "; Rayleigh length " + times,
                        brief + "; zR " + times,
                        brief + "; zR " + zR,
                        brief));
    }

    /** For a stretch of a leg that begins at a part of a name. */
    static CloseUpWords of(Waist w, String from) {
        String begin = w.isInside() ? "the entry of " + from : from;
        String zR = Figures.mm(w.rayleigh());
        String after = Figures.mm(Math.abs(w.after())) + (w.after() < 0 ? " before " : " behind ") + begin;
        String outside = w.isReal() ? "" : ", outside";
        String waist = "waist " + Figures.um(w.radius());
        return new CloseUpWords(
                List.of(waist + outside, Figures.um(w.radius())),
                List.of(after + ", Rayleigh length " + zR, after + ", zR " + zR, after));
    }

    /** Which wording of the first line fits a room, px; the last where none does. */
    int firstThatFits(Plane plane, double room) {
        int i = 0;
        while (i < where.size() - 1 && Lettering.width(first(plane, i), Type.STRONG) > room) {
            i++;
        }
        return i;
    }

    /** Which wording of the second line fits a room, px; the last where none does. */
    int secondThatFits(double room) {
        int i = 0;
        while (i < further.size() - 1 && Lettering.width(further.get(i), Type.SMALL) > room) {
            i++;
        }
        return i;
    }

    /** A wording of the first line, with the plane's name. */
    String first(Plane plane, int wording) {
        return plane.word() + " " + where.get(Math.min(wording, where.size() - 1));
    }

    /** A wording of the second line. */
    String second(int wording) {
        return further.get(Math.min(wording, further.size() - 1));
    }
}
