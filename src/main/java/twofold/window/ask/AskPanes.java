package twofold.window.ask;

import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
import twofold.cavity.Chain;
import twofold.cavity.Judgement;
import twofold.cavity.Reading;
import twofold.cavity.Trial;
import twofold.design.Bound;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.design.Quantity;
import twofold.design.Requirement;
import twofold.design.Tolerance;
import twofold.edit.AskEdits;
import twofold.edit.BoundKind;
import twofold.edit.Offers;
import twofold.layout.Laid;
import twofold.session.Ask;
import twofold.session.Session;
import twofold.session.Shown;

/** The lists of requirements, levers and tolerances. */
public final class AskPanes {
    private final AskPane<Requirement> requirements;
    private final AskPane<Lever> levers;
    private final AskPane<Tolerance> tolerances;

    /** Makes the lists. */
    public AskPanes(Session session) {
        requirements = new AskPane<>(
                session,
                new AskPane.Kind<>(
                        "requirements",
                        "requirement",
                        "Nothing is asked of this design.",
                        AskEdits.REQUIREMENTS,
                        Design::requirements,
                        now -> Head.of(Ask.of(now.cavity().judgements().subList(now.index(), now.index() + 1))
                                .get(0)),
                        () -> new RequirementSheet(session),
                        AskPanes::requirements));
        levers = new AskPane<>(
                session,
                new AskPane.Kind<>(
                        "levers",
                        "lever",
                        "No number of this design is let move.",
                        AskEdits.LEVERS,
                        Design::levers,
                        now -> Head.of(now.cavity().laid(), now.item()),
                        () -> new LeverSheet(session),
                        (laid, at) -> settings(laid, at, (set, place) -> Offers.lever(laid, set, place))));
        tolerances = new AskPane<>(
                session,
                new AskPane.Kind<>(
                        "tolerances",
                        "tolerance",
                        "Every number of this design is taken as exact.",
                        AskEdits.TOLERANCES,
                        Design::tolerances,
                        now -> Head.of(now.item()),
                        () -> new ToleranceSheet(session),
                        (laid, at) -> settings(laid, at, Offers::tolerance)));
    }

    private static List<AskPane.Offer<Requirement>> requirements(Laid laid, Offered at) {
        return Offers.quantities(laid.design(), at.at()).stream()
                .map(q -> new AskPane.Offer<>(q.title(), () -> starting(laid, q, at.at())))
                .toList();
    }

    /** A requirement that the design meets as it is. */
    private static Requirement starting(Laid laid, Quantity what, Optional<Place> at) {
        Chain chain = Chain.of(laid);
        Trial trial = chain.trial();
        trial.run();
        Requirement wish = Offers.requirement(what, at, Bound.Prefer.LARGEST);
        List<Double> now = Judgement.planes(wish).stream()
                .map(plane -> Reading.of(what, at, plane, wish.edge(), chain).of(trial))
                .toList();
        return Offers.requirement(what, at, BoundKind.starting(what, now));
    }

    private interface Make<T> {
        T of(String set, Place at);
    }

    private static <T> List<AskPane.Offer<T>> settings(Laid laid, Offered at, Make<T> make) {
        return at.at().stream()
                .flatMap(place -> Offers.settings(laid.design(), place).stream()
                        .map(set -> new AskPane.Offer<>(SetWords.title(set), () -> make.of(set, place))))
                .toList();
    }

    /** The list of requirements, with how the design does on each. */
    public Node requirements() {
        return requirements;
    }

    /** The list of levers. */
    public Node levers() {
        return levers;
    }

    /** The list of tolerances. */
    public Node tolerances() {
        return tolerances;
    }

    /** Shows a moment of the session. */
    public void show(Shown shown) {
        requirements.show(shown);
        levers.show(shown);
        tolerances.show(shown);
    }
}
