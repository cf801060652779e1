package twofold.layout;

import java.util.List;
import java.util.OptionalDouble;
import twofold.design.Hold;
import twofold.design.Point;

/** What became of moving mirrors. */
public sealed interface Move {
    /**
     * The mirrors moved.
     *
     * @param places of all mirrors, along the beam
     * @param holds those that kept a dragged mirror from the very point; empty where it got there
     */
    record Moved(List<Point> places, List<Hold> holds) implements Move {
        /** Copies the lists. */
        public Moved {
            places = List.copyOf(places);
            holds = List.copyOf(holds);
        }
    }

    /**
     * No layout does what was asked.
     *
     * @param words why, for a person
     * @param holds those that stand in the way: without any one of them it could be done
     * @param nearest the closest value that can be reached with the holds kept, in SI; empty where none was found
     */
    record Refused(String words, List<Hold> holds, OptionalDouble nearest) implements Move {
        /** Copies the list. */
        public Refused {
            holds = List.copyOf(holds);
        }
    }
}
