package twofold.window;

import java.util.List;
import java.util.Optional;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import twofold.design.Part;
import twofold.edit.PartEdits;
import twofold.file.Located;
import twofold.file.PartText;
import twofold.session.Session;

/** Parts on the clipboard, as the text that a design file has of them. */
final class PartClipboard {
    private final Session session;

    PartClipboard(Session session) {
        this.session = session;
    }

    private List<Part> selected() {
        return session.shown()
                .cavity()
                .map(c -> c.laid().design().parts())
                .map(parts -> session.shown().selection().all().stream()
                        .map(parts::get)
                        .toList())
                .orElse(List.of());
    }

    /** Puts the selected parts on the clipboard. */
    void copy() {
        ClipboardContent content = new ClipboardContent();
        content.putString(PartText.of(selected()));
        Clipboard.getSystemClipboard().setContent(content);
    }

    /** Puts the selected parts on the clipboard and takes them off the beam. */
    void cut() {
        copy();
        session.edit(PartEdits.delete(selected().stream().map(Part::name).toList()));
    }

    /** Places what is on the clipboard behind the selected part; answers what is wrong with its text. */
    List<Located> paste() {
        String text = Clipboard.getSystemClipboard().getString();
        PartText.Read read = PartText.read(text == null ? "" : text);
        if (read.problems().isEmpty()) {
            session.edit(
                    PartEdits.paste(read.parts(), session.shown().selected().flatMap(this::name)));
        }
        return read.problems();
    }

    private Optional<String> name(int part) {
        return session.laid().map(l -> l.design().parts().get(part).name());
    }
}
