package twofold.study;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import java.util.function.Function;
import twofold.cavity.Chain;
import twofold.cavity.Reading;
import twofold.cavity.Sweeper;
import twofold.design.Lever;
import twofold.layout.Laid;

/** The worst value of a reading over a lever's whole range, see {@link Worst}. */
public final class WorstOver implements Sweeper {
    private final Laid laid;

    /** For levers and readings of a design. */
    public WorstOver(Laid laid) {
        this.laid = laid;
    }

    @Override
    public double worst(Lever lever, Function<Chain, Reading> reading, DoubleUnaryOperator goodness) {
        return new Worst(laid, List.of(), lever, reading, goodness).value();
    }
}
