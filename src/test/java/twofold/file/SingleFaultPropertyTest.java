package twofold.file;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.core.io.JsonStringEncoder;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import twofold.RandomDesigns;
import twofold.design.Subject;

/** One fault in a file is one problem: what stands in for an unreadable value causes no others. */
class SingleFaultPropertyTest {
    /** Writes a document again with one of its values, or one of its keys, made wrong. */
    private static final class Spoiled {
        private final boolean keys;
        private final int wanted;
        private final StringBuilder text = new StringBuilder();
        private int seen;
        private Subject where = Subject.DOCUMENT;

        Spoiled(Json root, boolean keys, int wanted) {
            this.keys = keys;
            this.wanted = wanted;
            write(root, Subject.DOCUMENT);
        }

        /** Whether there was such a value or key. */
        boolean isSpoiled() {
            return seen > wanted;
        }

        private boolean isNext(Subject here) {
            boolean next = seen++ == wanted;
            if (next) {
                where = here;
            }
            return next;
        }

        private void write(Json json, Subject here) {
            if (!keys && !here.equals(Subject.DOCUMENT) && isNext(here)) {
                text.append("null");
            } else if (json instanceof Json.Obj o) {
                String separator = "{";
                for (Map.Entry<String, Json.Member> m : o.members().entrySet()) {
                    String key = keys && isNext(here) ? "qqqqqqqqqqqq" : m.getKey();
                    text.append(separator).append('"').append(key).append("\":");
                    write(m.getValue().value(), here.at(m.getKey()));
                    separator = ",";
                }
                text.append(o.members().isEmpty() ? "{}" : "}");
            } else if (json instanceof Json.Arr a) {
                text.append('[');
                for (int i = 0; i < a.elements().size(); i++) {
                    text.append(i == 0 ? "" : ",\n");
                    write(a.elements().get(i), here.at(i));
                }
                text.append(']');
            } else if (json instanceof Json.Str s) {
                text.append('"')
                        .append(JsonStringEncoder.getInstance().quoteAsString(s.text()))
                        .append('"');
            } else {
                text.append(json.words());
            }
        }
    }

    private static Json tree(String text) {
        return JsonText.parse(text, new Faults()).orElseThrow();
    }

    private static List<Spoiled> all(boolean keys) {
        List<String> texts = new ArrayList<>(Texts.all());
        for (long seed = 1; seed <= 8; seed++) {
            texts.add(DesignWriter.text(RandomDesigns.of(seed)));
        }
        List<Spoiled> all = new ArrayList<>();
        for (String text : texts) {
            Json root = tree(text);
            for (int n = 0; ; n++) {
                Spoiled spoiled = new Spoiled(root, keys, n);
                if (!spoiled.isSpoiled()) {
                    break;
                }
                all.add(spoiled);
            }
        }
        return all;
    }

    @Test
    void aValueOfTheWrongTypeIsOneProblem() {
        List<Spoiled> all = all(false);
        assertThat(all).hasSizeGreaterThan(300);
        for (Spoiled spoiled : all) {
            List<Located> problems = Texts.read(spoiled.text.toString()).problems();
            assertThat(problems).as("%s in %s", spoiled.where, spoiled.text).hasSize(1);
            assertThat(problems.get(0).problem().found()).isEqualTo("found null");
            assertThat(problems.get(0).problem().where()).isEqualTo(spoiled.where);
        }
    }

    @Test
    void anUnknownKeyIsAProblemOfItsObjectAlone() {
        for (Spoiled spoiled : all(true)) {
            List<Located> problems = Texts.read(spoiled.text.toString()).problems();
            assertThat(problems).as("%s in %s", spoiled.where, spoiled.text).hasSizeBetween(1, 4);
            assertThat(problems)
                    .as("%s", spoiled.text)
                    .anySatisfy(p -> assertThat(p.problem().found()).startsWith("found \"qqqqqqqqqqqq\""));
            int depth = spoiled.where.steps().size();
            assertThat(problems).as("%s in %s", spoiled.where, spoiled.text).allSatisfy(p -> {
                List<String> steps = p.problem().where().steps();
                assertThat(steps.subList(0, Math.min(depth, steps.size()))).isEqualTo(spoiled.where.steps());
                assertThat(steps.size()).isBetween(depth, depth + 1);
            });
        }
    }
}
