package twofold.command;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import twofold.design.Unit;
import twofold.file.Csv;
import twofold.study.Asked;
import twofold.study.Axis;
import twofold.study.Survey;
import twofold.study.ZonesAlong;

/** A survey as CSV: the levers' values, the quantities, and on demand the zone of each plane that holds the point. */
final class SurveyCsv {
    /** Axes up to this size are put into words once and not at every point. */
    private static final int MOST_KEPT = 1 << 16;

    private final Survey survey;
    private final List<ZonesAlong> zones;
    private final List<@Nullable String[]> texts = new ArrayList<>();
    private final List<Unit> units;

    /**
     * @param survey whose question ends with the stability margins of the zones' planes
     * @param zones of each plane that is to have a column
     */
    SurveyCsv(Survey survey, List<ZonesAlong> zones) {
        this.survey = survey;
        this.zones = zones;
        this.units = survey.question().quantities().stream()
                .map(q -> q.what().unit())
                .toList();
        for (Axis axis : survey.axes()) {
            texts.add(axis.size() <= MOST_KEPT ? texts(axis) : null);
        }
    }

    private static String[] texts(Axis axis) {
        String[] all = new String[axis.size()];
        for (int i = 0; i < all.length; i++) {
            all[i] = axis.unit().text(axis.value(i));
        }
        return all;
    }

    private int quantities() {
        return units.size() - zones.size();
    }

    /** Writes all of it; false where the work was stopped. */
    boolean write(Streams streams, ProgressLine progress) {
        byte[] header = Csv.bytes(header());
        streams.out().write(header, 0, header.length);
        boolean ended = survey.run(
                Runtime.getRuntime().availableProcessors(),
                this::rows,
                rows -> streams.out().write(rows, 0, rows.length),
                progress);
        streams.out().flush();
        return ended;
    }

    private String header() {
        List<Csv.Column> columns = new ArrayList<>();
        survey.axes().forEach(a -> columns.add(new Csv.Column(a.lever().name(), a.unit())));
        List<Asked> asked = survey.question().quantities();
        asked.subList(0, quantities())
                .forEach(q -> columns.add(new Csv.Column(q.text(), q.what().unit())));
        zones.forEach(z -> columns.add(new Csv.Column("zone " + z.plane().word(), Unit.ONE)));
        return Csv.header(columns);
    }

    private byte[] rows(Survey.Piece piece) {
        StringBuilder rows = new StringBuilder(piece.count() * 48);
        for (int i = 0; i < piece.count(); i++) {
            for (int axis = 0; axis < survey.axes().size(); axis++) {
                lever(axis, survey.index(axis, piece.first() + i), rows);
            }
            for (int q = 0; q < quantities(); q++) {
                rows.append(',');
                Csv.number(piece.answer(i, q), units.get(q), rows);
            }
            for (int z = 0; z < zones.size(); z++) {
                rows.append(',').append(zone(z, piece, i));
            }
            rows.append('\n');
        }
        return Csv.bytes(rows);
    }

    private void lever(int axis, int index, StringBuilder rows) {
        if (axis > 0) {
            rows.append(',');
        }
        String[] kept = texts.get(axis);
        if (kept != null) {
            rows.append(kept[index]);
        } else {
            Csv.number(
                    survey.axes().get(axis).value(index),
                    survey.axes().get(axis).unit(),
                    rows);
        }
    }

    private String zone(int number, Survey.Piece piece, int point) {
        double margin = piece.answer(point, quantities() + number);
        double value = survey.axes().get(0).value(survey.index(0, piece.first() + point));
        return margin > 0 ? Csv.cell(zones.get(number).zone(value)) : "";
    }
}
