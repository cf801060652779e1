package twofold.file;

import java.util.List;
import java.util.Optional;
import twofold.design.Design;

/**
 * What came of reading a design file.
 *
 * @param design present exactly when there is no problem
 * @param problems all that is wrong with the file, by place
 */
public record ReadDesign(Optional<Design> design, List<Located> problems) {
    /** Copies the list. */
    public ReadDesign {
        problems = List.copyOf(problems);
    }
}
