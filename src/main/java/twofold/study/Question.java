package twofold.study;

import java.util.List;
import java.util.function.Function;
import twofold.cavity.Chain;
import twofold.cavity.Reading;
import twofold.design.Lever;
import twofold.layout.Laid;

/**
 * What some quantities come to while some levers move. Immutable, shared by all threads; each thread asks with an
 * {@link Asker} of its own.
 *
 * @param laid the design as it stands
 * @param levers of it, set together
 * @param quantities to read
 */
public record Question(Laid laid, List<Lever> levers, List<Asked> quantities) {
    /** Copies the lists. */
    public Question {
        levers = List.copyOf(levers);
        quantities = List.copyOf(quantities);
    }

    /** An asker for one thread. */
    public Asker asker() {
        return Asker.of(
                laid,
                levers,
                quantities.stream()
                        .<Function<Chain, Reading>>map(q -> q::reading)
                        .toList());
    }
}
