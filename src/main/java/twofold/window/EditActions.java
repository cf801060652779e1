package twofold.window;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import javafx.scene.input.KeyCombination;
import twofold.design.Kind;
import twofold.design.Names;
import twofold.design.Part;
import twofold.design.Problem;
import twofold.edit.Edit;
import twofold.edit.NearestStable;
import twofold.edit.PartEdits;
import twofold.layout.Laid;
import twofold.layout.Outcome;
import twofold.session.Session;
import twofold.session.Shown;

/** What can be done to the open design, by menus, keys and buttons. */
final class EditActions {
    private static final String NOTHING_OPEN = "nothing is open";
    private static final String NOTHING_SELECTED = "nothing is selected";

    private final Session session;
    private final Editor editor;
    private final PartClipboard clipboard;

    EditActions(Editor editor) {
        this.editor = editor;
        this.session = editor.session();
        this.clipboard = new PartClipboard(session);
    }

    Action undo() {
        return Action.of("undo", "Undo", "Shortcut+Z", "Takes the last step back", session::undo)
                .saying(() -> shown().undo().map(s -> "Undo " + s).orElse("Undo"))
                .unless(() -> shown().undo().isPresent() ? Optional.empty() : Optional.of("nothing was done yet"));
    }

    Action redo() {
        return Action.of("redo", "Redo", "Shortcut+Shift+Z", "Does the step again that was undone", session::redo)
                .saying(() -> shown().redo().map(s -> "Redo " + s).orElse("Redo"))
                .unless(() -> shown().redo().isPresent() ? Optional.empty() : Optional.of("nothing was undone"));
    }

    /** The same on a second key. */
    KeyCombination redoToo() {
        return KeyCombination.valueOf("Shortcut+Y");
    }

    List<Action> parts() {
        return List.of(
                Action.of(
                                "cut",
                                "Cut",
                                "Shortcut+X",
                                "Takes the selected parts off the beam, to paste them",
                                clipboard::cut)
                        .unless(() -> whyNot(PartEdits::delete)),
                Action.of("copy", "Copy", "Shortcut+C", "Copies the selected parts as text", clipboard::copy)
                        .unless(this::selectedNone),
                Action.of(
                                "paste",
                                "Paste",
                                "Shortcut+V",
                                "Places copied parts behind the selected one",
                                () -> editor.pasted(clipboard.paste()))
                        .unless(this::closed),
                Action.of(
                                "duplicate",
                                "Duplicate",
                                "Shortcut+D",
                                "Copies the selected parts behind themselves",
                                () -> edit(PartEdits::duplicate))
                        .unless(() -> whyNot(PartEdits::duplicate)),
                Action.of(
                                "delete",
                                "Delete",
                                "Delete",
                                "Takes the selected parts off the beam",
                                () -> edit(PartEdits::delete))
                        .unless(() -> whyNot(PartEdits::delete)),
                Action.of("rename", "Rename", "F2", "Gives the selected part another name", editor::rename)
                        .unless(this::selectedNone),
                Action.of(
                                "upstream",
                                "Move upstream",
                                "Alt+Page_Up",
                                "Moves the selected parts one place up the beam",
                                () -> edit(n -> PartEdits.reorder(n, false)))
                        .unless(() -> whyNot(n -> PartEdits.reorder(n, false))),
                Action.of(
                                "downstream",
                                "Move downstream",
                                "Alt+Page_Down",
                                "Moves the selected parts one place down the beam",
                                () -> edit(n -> PartEdits.reorder(n, true)))
                        .unless(() -> whyNot(n -> PartEdits.reorder(n, true))),
                Action.of("select-all", "Select all", "Shortcut+A", "Selects every part", session::selectAll)
                        .unless(this::closed));
    }

    Action nearestStable() {
        return Action.of(
                        "nearest-stable",
                        "Nearest stable place",
                        "Shortcut+M",
                        "Slides the selected part along its leg to the middle of the nearest stretch in which both planes"
                                + " are stable",
                        () -> session.selectedPart().ifPresent(p -> session.editLater(NearestStable.edit(p.name()))))
                .unless(this::selectedNone);
    }

    /** Placing a part of each kind. */
    List<Action> placing() {
        return List.of(Kind.values()).stream()
                .map(kind -> Action.of(
                                "place-" + kind.word(),
                                Names.capital(kind.word()),
                                "Shortcut+" + (List.of(Kind.values()).indexOf(kind) + 1),
                                "Hangs a new " + kind.word() + " at the pointer, to be put on a leg",
                                () -> editor.place(kind))
                        .unless(this::closed))
                .toList();
    }

    private Shown shown() {
        return session.shown();
    }

    Optional<String> closed() {
        return shown().cavity().isPresent() ? Optional.empty() : Optional.of(NOTHING_OPEN);
    }

    private Optional<String> selectedNone() {
        return closed().or(() -> selected().isEmpty() ? Optional.of(NOTHING_SELECTED) : Optional.empty());
    }

    /** Names of the selected parts. */
    private List<String> selected() {
        return shown().cavity()
                .map(c -> c.laid().design().parts())
                .map(parts -> shown().selection().all().stream()
                        .map(parts::get)
                        .map(Part::name)
                        .toList())
                .orElse(List.of());
    }

    private void edit(Function<List<String>, Edit> edit) {
        session.edit(edit.apply(selected()));
    }

    private Optional<String> whyNot(Function<List<String>, Edit> edit) {
        return selectedNone().or(() -> refusal(session.would(edit.apply(selected()))));
    }

    static Optional<String> refusal(Outcome<Laid> outcome) {
        return outcome.problems().stream().map(Problem::message).findFirst();
    }
}
