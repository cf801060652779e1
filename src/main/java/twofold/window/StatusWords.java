package twofold.window;

import java.util.Optional;
import twofold.cavity.Cavity;
import twofold.cavity.Judgement;
import twofold.cavity.State;
import twofold.design.Unit;
import twofold.session.Shown;
import twofold.session.Source;

/** What the status line and the window's title say. */
final class StatusWords {
    private static final String PROGRAM = "Twofold";

    private StatusWords() {}

    static String title(Shown shown) {
        return shown.source()
                .or(shown::attended)
                .map(Source::name)
                .map(n -> (shown.isUnsaved() ? "• " : "") + n + " – " + PROGRAM)
                .orElse(PROGRAM);
    }

    static String said(Shown shown) {
        if (shown.trouble().isPresent()) {
            return shown.trouble().get();
        }
        if (!shown.obstacles().isEmpty()) {
            return "That cannot be done: " + shown.obstacles().get(0).message();
        }
        if (shown.failure().isPresent()) {
            return name(shown) + " cannot be read: " + shown.failure().get();
        }
        if (!shown.problems().isEmpty()) {
            int count = shown.problems().size();
            return name(shown) + (count == 1 ? " has a problem." : " has " + count + " problems.");
        }
        return shown.cavity().map(c -> said(c) + met(c)).orElse("Nothing is open.");
    }

    private static String name(Shown shown) {
        return shown.attended().map(Source::name).orElse("The file");
    }

    /** " 3 of 5 requirements are not met.", or nothing where nothing is asked. */
    private static String met(Cavity cavity) {
        long asked = count(cavity, Judgement.Verdict.MET) + count(cavity, Judgement.Verdict.NOT_MET);
        long failed = count(cavity, Judgement.Verdict.NOT_MET);
        if (asked == 0) {
            return "";
        }
        return failed == 0
                ? " All requirements are met."
                : " " + failed + " of " + asked + (asked == 1 ? " requirement is" : " requirements are") + " not met.";
    }

    private static long count(Cavity cavity, Judgement.Verdict verdict) {
        return cavity.judgements().stream().filter(j -> j.verdict() == verdict).count();
    }

    /** The head of the list of requirements: "Requirements, 2 !", short as a tab has to be; the status line says it in full. */
    static String asked(Shown shown) {
        long failed =
                shown.cavity().map(c -> count(c, Judgement.Verdict.NOT_MET)).orElse(0L);
        return failed == 0 ? "Requirements" : "Requirements, " + failed + " !";
    }

    private static String said(Cavity cavity) {
        State t = cavity.tangential().state();
        State s = cavity.sagittal().state();
        if (t == State.STABLE && s == State.STABLE) {
            return "Both planes are stable.";
        }
        if (t == s) {
            return t == State.EDGE ? "Both planes stand on the edge of stability." : "Neither plane is stable.";
        }
        return "Tangential " + t.word() + ", sagittal " + s.word() + ".";
    }

    static String facts(Shown shown) {
        Optional<Cavity> cavity = shown.cavity();
        return cavity.map(c -> "round trip " + Unit.MM.shown(c.roundTrip()) + " mm · free spectral range "
                        + Unit.MHZ.shown(c.freeSpectralRange()) + " MHz · "
                        + Unit.NM.text(c.laid().design().wavelength()) + " nm")
                .orElse("");
    }
}
