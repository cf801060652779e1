package twofold.design;

/**
 * A plane-parallel crystal, stated by the path inside it, with a lens in its middle where it is pumped.
 *
 * @param name unique in the design
 * @param length path inside along the beam, m
 * @param thermalPower of the lens in its middle, inside the faces, 1/m
 * @param slab its faces and everything else
 */
public record Crystal(String name, double length, TwoPowers thermalPower, Slab slab) implements Part {

    static Crystal of(String name, Values v) {
        return new Crystal(name, v.number(Field.INSIDE), v.get(Field.THERMAL_POWER, TwoPowers.class), Slab.of(v));
    }

    @Override
    public Kind kind() {
        return Kind.CRYSTAL;
    }

    @Override
    public Values values() {
        return slab.values().with(Field.INSIDE, (Object) length).with(Field.THERMAL_POWER, thermalPower);
    }

    @Override
    public <R> R match(Cases<R> cases) {
        return cases.crystal(this);
    }
}
