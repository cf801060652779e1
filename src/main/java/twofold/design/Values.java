package twofold.design;

import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;

/**
 * The values of a part's fields, by field: what lies between a record of the {@link Part} family and anything that
 * handles fields without knowing the kind. Immutable. A value has the Java type of its field's {@link Field.Form}.
 */
public final class Values {
    /** No values. */
    public static final Values NONE = new Values(new EnumMap<>(Field.class));

    private final Map<Field, Object> map;

    private Values(Map<Field, Object> map) {
        this.map = map;
    }

    /** These values with one set. */
    public Values with(Field field, Object value) {
        Map<Field, Object> copy = new EnumMap<>(Field.class);
        copy.putAll(map);
        copy.put(field, value);
        return new Values(copy);
    }

    /** These values with one set where it is present. */
    public Values with(Field field, OptionalDouble value) {
        return value.isPresent() ? with(field, (Object) value.getAsDouble()) : this;
    }

    /** These values with one set where it is present. */
    public Values with(Field field, Optional<?> value) {
        return value.isPresent() ? with(field, (Object) value.get()) : this;
    }

    /** These values without one. */
    public Values without(Field field) {
        Map<Field, Object> copy = new EnumMap<>(Field.class);
        copy.putAll(map);
        copy.remove(field);
        return new Values(copy);
    }

    /** The stated values, in the vocabulary's order. */
    public Map<Field, Object> stated() {
        return Collections.unmodifiableMap(map);
    }

    /** Whether a field is stated. */
    public boolean states(Field field) {
        return map.containsKey(field);
    }

    /** The value of a field, stated or by default. */
    public Optional<Object> find(Field field) {
        Object stated = map.get(field);
        return stated != null ? Optional.of(stated) : field.fallback();
    }

    double number(Field field) {
        return get(field, Double.class);
    }

    OptionalDouble optional(Field field) {
        return Field.number(map.get(field));
    }

    Glass glass() {
        @Nullable Object material = map.get(Field.MATERIAL);
        return new Glass(optional(Field.INDEX), material == null ? Optional.empty() : Optional.of((String) material));
    }

    <T> T get(Field field, Class<T> type) {
        return type.cast(find(field).orElseThrow(() -> new IllegalArgumentException(field.json() + " is missing")));
    }

    <T> Optional<T> maybe(Field field, Class<T> type) {
        return find(field).map(type::cast);
    }

    @Override
    public boolean equals(@Nullable Object other) {
        return other instanceof Values v && v.map.equals(map);
    }

    @Override
    public int hashCode() {
        return map.hashCode();
    }

    @Override
    public String toString() {
        return map.toString();
    }
}
