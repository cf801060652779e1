package twofold.window.bench;

import twofold.picture.Anchor;
import twofold.picture.Ink;
import twofold.picture.Painter;
import twofold.picture.Type;

/** What the bench shows before anything is open: how to open something. */
final class Empty {
    private Empty() {}

    static void draw(Painter on, double width, double height) {
        on.text("Nothing is open.", width / 2, height / 2 - 12, Type.TITLE, Ink.TEXT, Anchor.MIDDLE);
        on.text(
                "Open a design with Ctrl+O, drop a file here, or take a sample from the File menu.",
                width / 2,
                height / 2 + 12,
                Type.BODY,
                Ink.QUIET,
                Anchor.MIDDLE);
    }
}
