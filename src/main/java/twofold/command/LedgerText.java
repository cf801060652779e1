package twofold.command;

import java.util.List;
import java.util.Optional;
import twofold.cavity.Cavity;
import twofold.cavity.Ledger;
import twofold.design.Part;
import twofold.design.Unit;
import twofold.layout.Leg;
import twofold.layout.Standing;

/** What each part adds to the difference between the planes, for a person. */
final class LedgerText {
    private LedgerText() {}

    /** The ledger, or why there is none; empty where there is no beam in whose place to look. */
    static Optional<String> of(Cavity cavity) {
        if (cavity.ledgerLeg().isEmpty()) {
            return Optional.empty();
        }
        List<Part> parts = cavity.laid().design().parts();
        Leg leg = cavity.laid().legs().get(cavity.ledgerLeg().get());
        String name = parts.get(leg.from()).name() + "/" + parts.get(leg.to()).name();
        if (cavity.ledger().isEmpty()) {
            return Optional.of("astigmatism ledger: none along " + name
                    + (cavity.sagittal().isStable()
                            ? ", where no lower edge bounds the zone in both planes\n"
                            : ", as the sagittal plane is not stable\n"));
        }
        Ledger ledger = cavity.ledger().get();
        Table table = new Table();
        ledger.shares().forEach(s -> table.row("  " + parts.get(s.part()).name(), millimetres(s.length())));
        if (!ledger.shares().isEmpty()) {
            table.row("  sum", millimetres(ledger.sum()));
        }
        table.row("  edge split", millimetres(ledger.split()));
        return Optional.of("astigmatism ledger: the " + ledger.edge().word() + " edge along " + name
                + ", tangential minus sagittal\n" + table.text("")
                + (isInReach(ledger, cavity) ? "" : "  out of reach: the parts alone are longer\n"));
    }

    /** Whether mirrors can come so close that the edge is reached. */
    private static boolean isInReach(Ledger ledger, Cavity cavity) {
        double parts = cavity.laid().legs().get(ledger.leg()).parts().stream()
                .mapToDouble(Standing::length)
                .sum();
        return ledger.at().path() >= parts;
    }

    /** To a micrometre: these lengths are differences. */
    private static String millimetres(double metres) {
        return Double.isNaN(metres) ? "-" : Unit.fixed(Unit.MM.fromSi(metres), 3) + " mm";
    }
}
