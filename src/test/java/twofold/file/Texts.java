package twofold.file;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;

/** Texts of design files for tests. */
final class Texts {
    /** The example of the file format's description. */
    static final String EXAMPLE = """
            {
              "format": "twofold/1",
              "title": "Lake-ice profiler, pump-side cavity",
              "notes": "free text",
              "wavelength_nm": 800,
              "shape": "standing-wave",
              "parts": [
                { "name": "End A",  "kind": "mirror", "at_mm": [0, 0] },
                { "name": "Fold 1", "kind": "mirror", "at_mm": [480, 0], "roc_mm": 100, "reflectance": 0.9995 },
                { "name": "Rod",    "kind": "crystal", "along_mm": "middle", "length_mm": 5, "index": 1.76,
                  "incidence_deg": "brewster", "side": "left" },
                { "name": "Fold 2", "kind": "mirror", "at_mm": [378.9482, 25.9354], "roc_mm": 100 },
                { "name": "End B",  "kind": "mirror", "at_mm": [998.9482, 25.9354], "reflectance": 0.98 }
              ],
              "holds":        [ { "leg": ["End A", "Fold 1"] }, { "place": "End A" } ],
              "levers":       [ { "name": "fold", "set": "incidence_deg", "of": ["Fold 1", "Fold 2"], "from": 4, "to": 20 },
                                { "name": "gap", "set": "leg_mm", "of": [["Fold 1", "Fold 2"]], "from": 102, "to": 108, "adjuster": true } ],
              "requirements": [ { "what": "waist_offset_rayleighs", "at": "Rod", "plane": "both", "between": [-0.1, 0.1] },
                                { "what": "roundness", "at": "End B", "at_least": 0.95 } ],
              "tolerances":   [ { "set": "roc_mm", "of": ["Fold 1"], "plus_minus_percent": 1 },
                                { "set": "leg_mm", "of": [["Fold 1", "Fold 2"]], "plus_minus": 0.2 } ]
            }
            """;

    /** A ring with every kind of part, and every form of hold, lever, requirement and tolerance. */
    static final String EVERYTHING = """
            {
              "format": "twofold/1",
              "title": "Eis \u2014 \u00e4\u00f6\u00fc \ud834\udd1e",
              "wavelength_nm": 1064.15,
              "shape": "ring",
              "parts": [
                { "name": "M1", "kind": "mirror", "at_mm": [0, 0], "roc_mm": -375.4, "transmittance": 0, "clear_diameter_mm": 20 },
                { "name": "Lens", "kind": "lens", "along_mm": 100.1, "focal_length_mm": 250, "incidence_deg": 5,
                  "material": "BK7", "tilt_plane": "sagittal", "mount_mm": [30, 10] },
                { "name": "Box", "kind": "matrix", "along_mm": 200, "length_mm": 10, "tangential": [1, 12.5, 0, 1],
                  "sagittal": [0.5, 0, 0.001, 2] },
                { "name": "M2", "kind": "mirror", "at_mm": [500, 0], "curvature_per_m": 4, "diameter_mm": 12.7, "thickness_mm": 3 },
                { "name": "Stop", "kind": "aperture", "along_mm": 60, "diameter_mm": 2 },
                { "name": "Slit", "kind": "aperture", "along_mm": 70, "slit_tangential_mm": 1, "slit_sagittal_mm": 2 },
                { "name": "Mark", "kind": "aperture", "along_mm": 80 },
                { "name": "M3", "kind": "mirror", "at_mm": [500, 300], "mount_mm": [30, 20] },
                { "name": "Up", "kind": "plate", "along_mm": 100, "thickness_mm": 3, "index": 1.5, "incidence_deg": 10,
                  "tilt_plane": "sagittal" },
                { "name": "Down", "kind": "plate", "along_mm": 140, "thickness_mm": 3, "index": 1.5, "incidence_deg": 10,
                  "tilt_plane": "sagittal", "side": "down", "loss": 0.001, "mount_mm": [20, 5] },
                { "name": "M4", "kind": "mirror", "at_mm": [0, 300] },
                { "name": "Rod", "kind": "crystal", "along_mm": "middle", "length_mm": 8, "material": "YAG",
                  "incidence_deg": 1.5, "side": "right", "thermal_power_per_m": [2.5, -1e-7] },
                { "name": "Rod 2", "kind": "crystal", "along_mm": 200, "length_mm": 8, "index": 1.82, "material": "YAG",
                  "thermal_power_per_m": 3 }
              ],
              "holds": [ { "leg": ["M1", "M2"] }, { "incidence": "M2" }, { "place": "M3" }, { "direction": ["M2", "M3"] },
                         { "round_trip": true } ],
              "levers": [ { "name": "heat", "set": "thermal_power_per_m", "of": ["Rod", "Rod 2"], "from": 0, "to": 5.5 },
                          { "name": "stock", "set": "roc_mm", "of": ["M1"], "among": [250, 500, -750] } ],
              "requirements": [
                { "what": "fsr_mhz", "equals": 187.35, "within": 0.1 },
                { "what": "zone_edge_split_mm", "at": ["M1", "M2"], "edge": "upper", "at_most": 1 },
                { "what": "radius_um", "at": "Rod", "plane": "tangential", "at_least": 120, "over": "heat" },
                { "what": "gouy_deg", "plane": "sagittal", "between": [91.3, 95.7] },
                { "what": "clearance_mm", "prefer": "largest" } ],
              "tolerances": [ { "set": "along_mm", "of": ["Lens"], "plus_minus": 0.5, "spread": "normal" } ]
            }
            """;

    /** A Z that was typed by legs and angles. */
    static final String TYPED = """
            { "format": "twofold/1", "wavelength_nm": 800, "shape": "standing-wave", "parts": [
              { "name": "End A", "kind": "mirror", "heading_deg": 30 },
              { "name": "Fold 1", "kind": "mirror", "leg_mm": 480, "incidence_deg": 7.9, "turn": "left", "roc_mm": 100 },
              { "name": "Rod", "kind": "crystal", "along_mm": "middle", "length_mm": 5, "index": 1.76, "incidence_deg": "brewster" },
              { "name": "Fold 2", "kind": "mirror", "leg_mm": 105, "incidence_deg": 7.9, "turn": "right", "roc_mm": 100 },
              { "name": "End B", "kind": "mirror", "leg_mm": 620 } ] }
            """;

    private Texts() {}

    /** All of them, and the samples that come with the program. */
    static List<String> all() {
        List<String> all = new ArrayList<>(List.of(EXAMPLE, EVERYTHING, TYPED));
        Path samples = Path.of("samples");
        if (Files.isDirectory(samples)) {
            try (Stream<Path> files = Files.list(samples)) {
                for (Path file : files.filter(f -> f.toString().endsWith(".json"))
                        .sorted()
                        .toList()) {
                    all.add(Files.readString(file));
                }
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        }
        return all;
    }

    /** A test resource of this package. */
    static String resource(String name) {
        try (InputStream in = Texts.class.getResourceAsStream(name)) {
            if (in == null) {
                throw new IllegalArgumentException("there is no resource " + name);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** What came of a text. */
    static ReadDesign read(String text) {
        return DesignReader.read(text.getBytes(StandardCharsets.UTF_8));
    }

    /** The problems of a text as lines of a file {@code f}. */
    static List<String> lines(String text) {
        return read(text).problems().stream().map(p -> p.line("f")).toList();
    }

    /** Does something under another default locale: with a comma in numbers, or with another i. */
    static void under(Locale locale, Runnable what) {
        Locale before = Locale.getDefault();
        Locale.setDefault(locale);
        try {
            what.run();
        } finally {
            Locale.setDefault(before);
        }
    }

    /** Locales whose numbers and letters differ from the file format's. */
    static List<Locale> locales() {
        return List.of(
                Locale.ROOT, Locale.GERMANY, Locale.forLanguageTag("tr-TR"), Locale.forLanguageTag("ar-EG-u-nu-arab"));
    }
}
