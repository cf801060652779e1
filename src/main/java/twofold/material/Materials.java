package twofold.material;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Materials by name. Immutable. */
public final class Materials {

    private static final String TABLE = "index-fits.tsv";
    private static final String COLUMNS = "name\tn² constant\tterms\tfrom µm\tto µm\t°C\tsource";
    private static final BigDecimal MICROMETRE = new BigDecimal("1e-6");
    private static final Materials STANDARD = new Materials(shipped());

    private final Map<String, Material> byName;

    private Materials(List<Material> materials) {
        Map<String, Material> map = new LinkedHashMap<>();
        for (Material material : materials) {
            if (map.put(material.name(), material) != null) {
                throw new IllegalArgumentException("material stated twice: " + material.name());
            }
        }
        byName = map;
    }

    /** The shipped table. */
    public static Materials standard() {
        return STANDARD;
    }

    /**
     * Reads a table. Lines that start with {@code #} are comments; the first other line names the columns. A term is
     * {@code FORM B C}, terms are separated by {@code ;}.
     *
     * @param text the table
     * @throws IllegalArgumentException with line number and line for what is not as said
     * @throws IOException if the text cannot be read
     */
    static Materials read(Reader text) throws IOException {
        List<Material> found = new ArrayList<>();
        BufferedReader lines = new BufferedReader(text);
        boolean begun = false;
        int number = 0;
        for (String line = lines.readLine(); line != null; line = lines.readLine()) {
            number++;
            if (line.startsWith("#")) {
                continue;
            }
            if (begun) {
                found.add(row(line, number));
            } else if (line.equals(COLUMNS)) {
                begun = true;
            } else {
                throw new IllegalArgumentException("line " + number + ": found " + line + ", expected " + COLUMNS);
            }
        }
        return new Materials(found);
    }

    /** The material with a name. */
    public Optional<Material> find(String name) {
        return Optional.ofNullable(byName.get(name));
    }

    /** All names, in the table's order. */
    public List<String> names() {
        return List.copyOf(byName.keySet());
    }

    private static List<Material> shipped() {
        try (InputStream bytes = Materials.class.getResourceAsStream(TABLE)) {
            if (bytes == null) {
                throw new IllegalStateException("the program's own table is missing: " + TABLE);
            }
            return List.copyOf(read(new InputStreamReader(bytes, StandardCharsets.UTF_8))
                    .byName
                    .values());
        } catch (IOException e) {
            throw new UncheckedIOException("the program's own table cannot be read: " + TABLE, e);
        }
    }

    private static Material row(String line, int number) {
        String[] cells = line.split("\t", -1);
        if (cells.length != COLUMNS.split("\t", -1).length) {
            throw new IllegalArgumentException("line " + number + ": found " + cells.length + " cells in " + line);
        }
        try {
            List<Term> terms = new ArrayList<>();
            for (String term : cells[2].split(";", -1)) {
                terms.add(term(term.strip()));
            }
            Material material = new Material(
                    cells[0],
                    Double.parseDouble(cells[1]),
                    terms,
                    metres(cells[3]),
                    metres(cells[4]),
                    cells[5].equals("room") ? OptionalDouble.empty() : OptionalDouble.of(Double.parseDouble(cells[5])),
                    cells[6]);
            if (!(material.from() < material.to())) {
                throw new IllegalArgumentException("an empty range");
            }
            return material;
        } catch (IllegalArgumentException e) {
            throw new IllegalArgumentException("line " + number + ": " + line, e);
        }
    }

    private static Term term(String text) {
        String[] words = text.split(" ", -1);
        if (words.length != 3) {
            throw new IllegalArgumentException("a term is FORM B C, found " + text);
        }
        return new Term(Term.Form.valueOf(words[0]), Double.parseDouble(words[1]), Double.parseDouble(words[2]));
    }

    /** Exact up to one rounding, so that a range's ends compare as the decimals that they are. */
    private static double metres(String micrometres) {
        return new BigDecimal(micrometres).multiply(MICROMETRE).doubleValue();
    }
}
