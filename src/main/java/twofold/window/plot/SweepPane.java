package twofold.window.plot;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
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
import twofold.study.Question;
import twofold.study.Swept;

/** A quantity over one lever, in both planes where it has them. */
final class SweepPane extends StudyPane {
    private static final int POINTS = 401;

    private final Pick<Lever> lever;
    private final QuantityPick quantity;

    SweepPane(Session session, Runner runner) {
        super("sweep", "Sweep: a quantity over a lever", session, runner);
        lever = new Pick<>("sweep-lever", "Lever", Lever::name, this::ask);
        quantity = new QuantityPick("sweep", Quantity.RADIUS, true, this::ask);
        List<Node> nodes = new ArrayList<>(List.of(lever));
        nodes.addAll(quantity.nodes());
        menus(nodes);
    }

    @Override
    void fill(Design design) {
        lever.fill(design.levers(), usual(design));
        quantity.fill(design);
    }

    @Override
    Outcome<Inquiry.Work<Picture>> work(Design design) {
        Optional<Lever> along = lever.picked();
        List<Asked> asked = quantity.asked();
        if (along.isEmpty() || asked.isEmpty()) {
            return Outcome.failed(new Problem(
                    Subject.DOCUMENT, "A sweep moves a lever, and this design has none.", "a design with a lever"));
        }
        Axis axis = Axis.of(along.get(), POINTS).ascending();
        return Outcome.of((laid, progress) -> Swept.of(
                        new Question(laid, List.of(along.get()), asked), axis, PlotTabs.threads(), progress)
                .map(SweepPicture::new));
    }

    @Override
    String hint() {
        return "Click a point to see that design.";
    }
}
