package twofold.design;

/**
 * A plane-parallel plate, stated by its thickness.
 *
 * @param name unique in the design
 * @param thickness across its faces, m
 * @param slab its faces and everything else
 */
public record Plate(String name, double thickness, Slab slab) implements Part {

    static Plate of(String name, Values v) {
        return new Plate(name, v.number(Field.ACROSS), Slab.of(v));
    }

    @Override
    public Kind kind() {
        return Kind.PLATE;
    }

    @Override
    public Values values() {
        return slab.values().with(Field.ACROSS, (Object) thickness);
    }

    @Override
    public <R> R match(Cases<R> cases) {
        return cases.plate(this);
    }
}
