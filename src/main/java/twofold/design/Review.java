package twofold.design;

import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** One pass over a design that collects its problems; lives for one call of {@link Design#problems()}. */
final class Review {
    private final Design design;
    private final List<Part> parts;
    private final int mirrors;
    private final Found found = new Found();
    private final PartReview part = new PartReview(found);
    private final References references;
    private final AskReview asks;

    Review(Design design) {
        this.design = design;
        this.parts = design.parts();
        this.mirrors = design.mirrors().size();
        references = new References(design, found);
        asks = new AskReview(design, found, references);
    }

    List<Problem> problems() {
        double wave = design.wavelength();
        if (!(wave >= Design.SHORTEST_WAVE && wave <= Design.LONGEST_WAVE)) {
            found.add(
                    Subject.DOCUMENT.at("wavelength_nm"),
                    "found " + Found.text(Unit.NM, wave),
                    "a number from " + Unit.NM.text(Design.SHORTEST_WAVE) + " to " + Unit.NM.text(Design.LONGEST_WAVE));
        }
        counts();
        names(Subject.DOCUMENT.at("parts"), parts.stream().map(Part::name).toList());
        for (int i = 0; i < parts.size(); i++) {
            part.part(Subject.part(i), parts.get(i));
        }
        for (int i = 0; i < design.holds().size(); i++) {
            hold(Subject.DOCUMENT.at("holds").at(i), design.holds().get(i));
        }
        names(
                Subject.DOCUMENT.at("levers"),
                design.levers().stream().map(Lever::name).toList());
        for (int i = 0; i < design.levers().size(); i++) {
            asks.lever(Subject.DOCUMENT.at("levers").at(i), design.levers().get(i));
        }
        for (int i = 0; i < design.requirements().size(); i++) {
            asks.requirement(
                    Subject.DOCUMENT.at("requirements").at(i),
                    design.requirements().get(i));
        }
        for (int i = 0; i < design.tolerances().size(); i++) {
            asks.tolerance(
                    Subject.DOCUMENT.at("tolerances").at(i), design.tolerances().get(i));
        }
        return found.problems();
    }

    /** What is wrong with one requirement, with places as if it were the first. */
    List<Problem> problems(Requirement requirement) {
        asks.requirement(Subject.DOCUMENT.at("requirements").at(0), requirement);
        return found.problems();
    }

    private void counts() {
        Subject where = Subject.DOCUMENT.at("parts");
        if (parts.size() > Design.MOST_PARTS) {
            found.add(where, "found " + parts.size() + " parts", "at most " + Design.MOST_PARTS);
        }
        boolean ring = design.shape() == Shape.RING;
        int least = ring ? 3 : 2;
        if (mirrors < least) {
            found.add(
                    where,
                    "found " + mirrors + (mirrors == 1 ? " mirror" : " mirrors"),
                    "at least " + least + " mirrors in a " + design.shape().word());
        }
        if (parts.isEmpty()) {
            return;
        }
        end(0, "a mirror as the first part");
        if (!ring) {
            end(parts.size() - 1, "a mirror as the last part of a standing-wave");
        }
    }

    private void end(int index, String accepted) {
        Kind kind = parts.get(index).kind();
        if (kind != Kind.MIRROR) {
            found.add(Subject.part(index).at("kind"), "found \"" + kind.word() + "\"", accepted);
        }
    }

    private void names(Subject list, List<String> names) {
        Set<String> seen = new HashSet<>();
        for (int i = 0; i < names.size(); i++) {
            String name = names.get(i);
            Subject where = list.at(i).at("name");
            if (!Names.accepts(name)) {
                found.add(where, "found \"" + Names.shown(name) + "\"", Names.ACCEPTED);
            } else if (!seen.add(name)) {
                found.add(where, "found \"" + name + "\" a second time", "a name that nothing else in the list has");
            }
        }
    }

    private void hold(Subject where, Hold hold) {
        if (hold instanceof Hold.Leg h) {
            references.leg(where.at("leg"), h.leg());
        } else if (hold instanceof Hold.Direction h) {
            references.leg(where.at("direction"), h.leg());
        } else if (hold instanceof Hold.Incidence h) {
            references.folding(where.at("incidence"), h.mirror());
        } else if (hold instanceof Hold.Position h) {
            references.mirror(where.at("place"), h.mirror());
        }
    }
}
