package twofold.cavity;

import java.util.function.DoubleUnaryOperator;
import java.util.function.Function;
import twofold.design.Lever;

/** Reads a quantity over a lever's whole range; what sets levers implements it. */
public interface Sweeper {
    /**
     * The value of a reading that is worst over a lever's whole range, in SI.
     *
     * @param lever to be moved, all else as designed
     * @param reading by the chain to read
     * @param goodness how good a value is; the worst has the least
     * @return NaN where the reading is undefined anywhere in the range
     */
    double worst(Lever lever, Function<Chain, Reading> reading, DoubleUnaryOperator goodness);
}
