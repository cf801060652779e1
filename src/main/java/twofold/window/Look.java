package twofold.window;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;
import java.util.stream.Collectors;
import javafx.scene.Parent;
import javafx.scene.text.Font;
import twofold.picture.Ink;
import twofold.picture.Theme;
import twofold.picture.Type;

/** How the window looks: one style sheet of ours, whose colours are the inks of a theme, and one font. */
public final class Look {
    private static final String SHEET = "/twofold/window/twofold.css";
    private static final Map<Type, Font> FONTS = fonts();

    private Look() {}

    /** The font of drawings. */
    static Font font(Type type) {
        return FONTS.getOrDefault(type, Font.getDefault());
    }

    private static Map<Type, Font> fonts() {
        Map<Type, Font> fonts = new EnumMap<>(Type.class);
        for (Type type : Type.values()) {
            fonts.put(type, load("/twofold/picture/DejaVuSans" + (type.isBold() ? "-Bold" : "") + ".ttf", type.size()));
        }
        return fonts;
    }

    private static Font load(String resource, double size) {
        try (InputStream file = Look.class.getResourceAsStream(resource)) {
            Font font = file == null ? null : Font.loadFont(file, size);
            if (font == null) {
                throw new IllegalStateException("the program's own font is missing: " + resource);
            }
            return font;
        } catch (IOException e) {
            throw new UncheckedIOException("the program's own font cannot be read: " + resource, e);
        }
    }

    /** Puts the style sheet and a theme's inks on a root. */
    static void apply(Parent root, Theme theme) {
        String sheet = String.valueOf(Look.class.getResource(SHEET));
        if (!root.getStylesheets().contains(sheet)) {
            root.getStylesheets().add(sheet);
        }
        root.setStyle(Arrays.stream(Ink.values())
                .map(ink -> "-ink-" + ink.token() + ": " + theme.css(ink) + ";")
                .collect(Collectors.joining(" ")));
    }
}
