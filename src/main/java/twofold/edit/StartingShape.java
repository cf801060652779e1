package twofold.edit;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Glass;
import twofold.design.Names;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.design.Turn;
import twofold.design.Unit;
import twofold.layout.Outcome;

/**
 * The shapes that a new design may start from. Each is made inside a zone: its gap, the leg that holds the focus, is as long
 * as the middle of the stretch in which both planes are stable; with a crystal at Brewster's angle its folds stand at the
 * angle that compensates, where both planes' lower zone edges lie at one place. The crystal's leg is held, and levers move
 * the gap and the folds.
 */
@SuppressWarnings("ImmutableEnumChecker") // the values are records and immutable lists
public enum StartingShape {
    /** Two mirrors that face each other. */
    TWO_MIRROR(
            "two-mirror",
            "Two-mirror cavity",
            List.of(CrystalCut.NONE, CrystalCut.NORMAL, CrystalCut.BREWSTER),
            usual(1064, CrystalCut.NONE, "YAG").with(StartingInput.END_B, 0.5),
            StartingInput.END_A,
            StartingInput.END_B,
            StartingInput.LENGTH),
    /** One curved fold; the crystal in the short arm. */
    V(
            "V",
            "V-fold cavity",
            List.of(CrystalCut.values()),
            usual(1064, CrystalCut.BREWSTER, "YAG"),
            StartingInput.FOLD,
            StartingInput.ARM,
            StartingInput.END_A,
            StartingInput.END_B,
            StartingInput.INCIDENCE),
    /** Two curved folds that turn opposite ways; the crystal between them. */
    Z(
            "Z",
            "Z-fold cavity",
            List.of(CrystalCut.values()),
            usual(800, CrystalCut.BREWSTER, "sapphire e"),
            StartingInput.FOLD_1,
            StartingInput.FOLD_2,
            StartingInput.ARM_1,
            StartingInput.ARM_2,
            StartingInput.END_A,
            StartingInput.END_B,
            StartingInput.INCIDENCE),
    /** Two curved folds that turn the same way, so that the arms cross; the crystal between them. */
    X(
            "X",
            "X-fold cavity",
            List.of(CrystalCut.values()),
            usual(800, CrystalCut.BREWSTER, "sapphire e"),
            StartingInput.FOLD_1,
            StartingInput.FOLD_2,
            StartingInput.ARM_1,
            StartingInput.ARM_2,
            StartingInput.END_A,
            StartingInput.END_B,
            StartingInput.INCIDENCE),
    /** A ring of two curved and two flat mirrors; the crystal between the curved ones. */
    BOW_TIE(
            "bow-tie",
            "Bow-tie ring",
            List.of(CrystalCut.values()),
            usual(1064, CrystalCut.NORMAL, "LBO z").with(StartingInput.CRYSTAL_LENGTH, 15e-3),
            StartingInput.CURVED_1,
            StartingInput.CURVED_2,
            StartingInput.ROUND_TRIP,
            StartingInput.INCIDENCE),
    /** A ring of two flat mirrors and a curved one; the crystal between the flat ones. */
    TRIANGLE(
            "triangle",
            "Triangular ring",
            List.of(CrystalCut.NONE, CrystalCut.NORMAL),
            usual(532, CrystalCut.NONE, "LBO z"),
            StartingInput.APEX,
            StartingInput.BASE,
            StartingInput.PERIMETER);

    private final String words;
    private final String title;
    private final List<CrystalCut> cuts;
    private final StartingValues usual;
    private final List<StartingInput> inputs;

    StartingShape(String words, String title, List<CrystalCut> cuts, StartingValues usual, StartingInput... ofItsOwn) {
        this.words = words;
        this.title = title;
        this.cuts = cuts;
        this.usual = usual;
        List<StartingInput> all = new ArrayList<>();
        all.add(StartingInput.WAVELENGTH);
        all.addAll(List.of(ofItsOwn));
        all.add(StartingInput.CRYSTAL_LENGTH);
        inputs = List.copyOf(all);
    }

    private static StartingValues usual(int nanometres, CrystalCut cut, String material) {
        Glass glass = new Glass(OptionalDouble.empty(), Optional.of(material));
        return new StartingValues(Map.of(StartingInput.WAVELENGTH, Unit.NM.toSi(nanometres)), cut, glass);
    }

    /** What it is called. */
    public String words() {
        return words;
    }

    /** The numbers that it starts from, in the order in which a person is asked; the crystal's last. */
    public List<StartingInput> inputs() {
        return inputs;
    }

    /** How its crystal may be cut. */
    public List<CrystalCut> cuts() {
        return cuts;
    }

    /** Whether a number is of account with these values: without a crystal its length is not, nor an angle that follows. */
    public boolean uses(StartingInput input, StartingValues values) {
        return switch (input) {
            case CRYSTAL_LENGTH -> values.hasCrystal();
            case INCIDENCE -> inputs.contains(input) && values.cut() != CrystalCut.BREWSTER;
            default -> inputs.contains(input);
        };
    }

    /** Values that give a design as they are. */
    public StartingValues defaults() {
        Map<StartingInput, Double> numbers = new EnumMap<>(StartingInput.class);
        for (StartingInput input : inputs) {
            OptionalDouble own = usual.find(input);
            OptionalDouble value = own.isPresent() ? own : input.usual();
            value.ifPresent(v -> numbers.put(input, v));
        }
        return new StartingValues(numbers, usual.cut(), usual.glass());
    }

    /**
     * A design of this shape, or what is wrong with the values, each by the words of its input, and what nearby would do.
     *
     * @param values of all inputs that are {@link #uses of account}; of others they are passed over
     */
    public Outcome<Design> make(StartingValues values) {
        List<Problem> problems = problems(values);
        if (!problems.isEmpty()) {
            return Outcome.failed(problems);
        }
        Outcome<StartingSearch.Found> found = StartingSearch.of(this, values);
        if (found.value().isPresent()) {
            return Outcome.of(
                    StartingLevers.added(plan(values), values, found.value().get()));
        }
        String nearby = StartingNearby.words(StartingNearby.of(this, values));
        return Outcome.failed(found.problems().stream()
                .map(p -> new Problem(p.where(), p.found(), nearby))
                .toList());
    }

    /** What is wrong with the values one by one, and with the crystal's glass. */
    List<Problem> problems(StartingValues values) {
        List<Problem> problems = new ArrayList<>();
        if (!cuts.contains(values.cut())) {
            problems.add(new Problem(
                    Subject.DOCUMENT.at("crystal"),
                    "found " + values.cut().words(),
                    Names.listed(cuts.stream().map(CrystalCut::words).toList())));
        }
        for (StartingInput input : inputs) {
            OptionalDouble value = values.find(input);
            if (!uses(input, values) || (value.isEmpty() && input.form() == StartingInput.Form.OPTIONAL)) {
                continue;
            }
            if (value.isEmpty()) {
                problems.add(new Problem(Subject.DOCUMENT.at(input.words()), "found nothing", input.accepted()));
            } else if (!input.accepts(value.getAsDouble())) {
                problems.add(new Problem(
                        Subject.DOCUMENT.at(input.words()),
                        "found " + input.shown(value.getAsDouble()),
                        input.accepted()));
            }
        }
        if (values.hasCrystal()) {
            OptionalDouble index = values.glass().index();
            if (values.glass().isNone()) {
                problems.add(new Problem(
                        Subject.DOCUMENT.at("crystal"), "found neither index nor material", "an index or a material"));
            } else if (index.isPresent() && !Field.INDEX.accepts(index.getAsDouble())) {
                problems.add(new Problem(
                        Subject.DOCUMENT.at("index"),
                        "found " + Unit.ONE.text(index.getAsDouble()),
                        Field.INDEX.accepted()));
            }
        }
        if (problems.isEmpty()) {
            problems.addAll(StartingPlan.standing(values).problems());
        }
        return problems;
    }

    /** How it stands on the table, by the two numbers that are yet unknown; the values have been checked. */
    StartingPlan plan(StartingValues values) {
        return switch (this) {
            case TWO_MIRROR -> StandingPlan.twoMirrors(values, title);
            case V -> StandingPlan.vee(values, title);
            case Z -> StandingPlan.fourMirrors(values, title, Turn.RIGHT);
            case X -> StandingPlan.fourMirrors(values, title, Turn.LEFT);
            case BOW_TIE -> BowTiePlan.of(values, title);
            case TRIANGLE -> new TrianglePlan(values, title);
        };
    }
}
