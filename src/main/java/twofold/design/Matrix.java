package twofold.design;

/**
 * A black box with a ray matrix in each plane.
 *
 * @param name unique in the design
 * @param along place of its middle on the leg
 * @param length physical, m
 * @param tangential forward, reduced slopes
 * @param sagittal forward, reduced slopes
 */
public record Matrix(String name, Along along, double length, FourNumbers tangential, FourNumbers sagittal)
        implements Part {

    static Matrix of(String name, Values v) {
        return new Matrix(
                name,
                v.get(Field.ALONG, Along.class),
                v.number(Field.BOX),
                v.get(Field.TANGENTIAL, FourNumbers.class),
                v.get(Field.SAGITTAL, FourNumbers.class));
    }

    @Override
    public Kind kind() {
        return Kind.MATRIX;
    }

    @Override
    public Values values() {
        return Values.NONE
                .with(Field.ALONG, along)
                .with(Field.BOX, (Object) length)
                .with(Field.TANGENTIAL, tangential)
                .with(Field.SAGITTAL, sagittal);
    }

    @Override
    public <R> R match(Cases<R> cases) {
        return cases.matrix(this);
    }
}
