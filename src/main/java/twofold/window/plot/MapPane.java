package twofold.window.plot;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
import org.jspecify.annotations.Nullable;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Problem;
import twofold.design.Quantity;
import twofold.design.Subject;
import twofold.layout.Outcome;
import twofold.session.Inquiry;
import twofold.session.Runner;
import twofold.session.Session;
import twofold.study.Asked;
import twofold.study.Axis;
import twofold.study.Levered;
import twofold.study.Mapped;
import twofold.study.Question;

/** A quantity over two levers. */
final class MapPane extends StudyPane {
    private static final int COLUMNS = 121;
    private static final int ROWS = 91;

    private final Pick<Lever> right;
    private final Pick<Lever> up;
    private final QuantityPick quantity;
    private @Nullable Design design;

    MapPane(Session session, Runner runner) {
        super("map", "Map: a quantity over two levers", session, runner);
        right = new Pick<>("map-right", "Right", Lever::name, () -> {
            others();
            ask();
        });
        up = new Pick<>("map-up", "Up", Lever::name, this::ask);
        quantity = new QuantityPick("map", Quantity.ROUNDNESS, false, this::ask);
        List<Node> nodes = new ArrayList<>(List.of(right, up));
        nodes.addAll(quantity.nodes());
        menus(nodes);
    }

    @Override
    void fill(Design next) {
        design = next;
        right.fill(next.levers(), usual(next));
        others();
        quantity.fill(next);
    }

    /** The levers that can be set beside the first. */
    private void others() {
        Design now = design;
        if (now != null) {
            up.fill(
                    now.levers().stream()
                            .filter(l -> right.picked()
                                    .map(r -> Levered.clash(now, r, l).isEmpty())
                                    .orElse(false))
                            .toList(),
                    Optional.empty());
        }
    }

    @Override
    Outcome<Inquiry.Work<Picture>> work(Design now) {
        List<Asked> asked = quantity.asked();
        if (right.picked().isEmpty() || up.picked().isEmpty() || asked.isEmpty()) {
            return Outcome.failed(new Problem(
                    Subject.DOCUMENT,
                    "A map moves two levers, and this design has "
                            + (now.levers().isEmpty() ? "none." : "no two that go together."),
                    "a design with two levers"));
        }
        List<Lever> levers = List.of(right.picked().get(), up.picked().get());
        Axis x = Axis.of(levers.get(0), COLUMNS).ascending();
        Axis y = Axis.of(levers.get(1), ROWS).ascending();
        return Outcome.of(
                (laid, progress) -> Mapped.of(new Question(laid, levers, asked), x, y, PlotTabs.threads(), progress)
                        .map(MapPicture::new));
    }

    @Override
    String hint() {
        return "Click a point to see that design.";
    }
}
