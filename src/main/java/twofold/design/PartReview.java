package twofold.design;

/** What is wrong with a part by itself: its numbers' limits, and what its fields say together. */
final class PartReview {
    /** How far a black box's determinant may be from 1: what four numbers typed to ten digits make. */
    private static final double DETERMINANT = 1e-9;

    /** How far reflectance and transmittance may add up beyond 1: the rounding of their sum. */
    private static final double SUM = 1e-12;

    private final Found found;

    PartReview(Found found) {
        this.found = found;
    }

    /** What is wrong with a part by itself. */
    void part(Subject where, Part part) {
        part.values().stated().forEach((field, value) -> numbers(where.at(field.json()), field, value));
        part.match(new Part.Cases<Void>() {
            @Override
            public Void mirror(Mirror m) {
                boolean each =
                        Field.REFLECTANCE.accepts(m.reflectance()) && Field.TRANSMITTANCE.accepts(m.transmittance());
                if (each && m.reflectance() + m.transmittance() > 1 + SUM) {
                    found.add(
                            where.at("transmittance"),
                            "found " + Unit.ONE.text(m.transmittance()) + " beside a reflectance of "
                                    + Unit.ONE.text(m.reflectance()),
                            "a sum of at most 1");
                }
                return done();
            }

            @Override
            public Void lens(Lens l) {
                if (l.tilt() != 0 && l.glass().index().orElse(0) == 1) {
                    found.add(where.at("index"), "found 1 for a tilted lens", "an index above 1");
                }
                if (l.tilt() != 0 && l.glass().isNone()) {
                    found.add(
                            where.at("incidence_deg"),
                            "found " + Unit.DEG.text(l.tilt()) + " without an index",
                            "index or material beside it, or 0");
                }
                return done();
            }

            @Override
            public Void plate(Plate p) {
                return slab(p.slab());
            }

            @Override
            public Void crystal(Crystal c) {
                return slab(c.slab());
            }

            private Void slab(Slab s) {
                if (s.glass().isNone()) {
                    found.add(where, "found neither index nor material", "one of them");
                }
                if (s.side().of() != s.tiltPlane()) {
                    found.add(
                            where.at("side"),
                            "found \"" + s.side().word() + "\" for a "
                                    + s.tiltPlane().word() + " tilt",
                            s.tiltPlane() == TiltPlane.TANGENTIAL ? "\"left\" or \"right\"" : "\"up\" or \"down\"");
                }
                return done();
            }

            @Override
            public Void aperture(Aperture a) {
                if (a.hole().isPresent()
                        && (a.slitTangential().isPresent() || a.slitSagittal().isPresent())) {
                    found.add(where.at("diameter_mm"), "found a hole beside a slit", "a hole, or slits, or neither");
                }
                return done();
            }

            @Override
            public Void matrix(Matrix m) {
                determinant("tangential", m.tangential());
                determinant("sagittal", m.sagittal());
                return done();
            }

            private void determinant(String plane, FourNumbers m) {
                double scale = Math.max(1, Math.abs(m.a() * m.d()));
                if (!(Math.abs(m.determinant() - 1) <= DETERMINANT * scale)) {
                    found.add(
                            where.at(plane),
                            "found the determinant " + Found.text(Unit.ONE, m.determinant()),
                            "a determinant A D − B C of 1");
                }
            }

            @SuppressWarnings("NullAway") // Void has no other value
            private Void done() {
                return null;
            }
        });
    }

    private void numbers(Subject where, Field field, Object value) {
        if (value instanceof Double d) {
            if (!(field == Field.ROC && d == Double.POSITIVE_INFINITY)) {
                number(where, field, d);
            }
        } else if (value instanceof Point p) {
            number(where.at(0), field, p.x());
            number(where.at(1), field, p.y());
        } else if (value instanceof Mount m) {
            number(where.at(0), field, m.width());
            number(where.at(1), field, m.depth());
        } else if (value instanceof Along a && !a.inMiddle()) {
            number(where, field, a.path());
        } else if (value instanceof FaceAngle f && !f.atBrewster()) {
            number(where, field, f.incidence());
        } else if (value instanceof TwoPowers p) {
            number(where, field, p.tangential());
            if (p.sagittal() != p.tangential()) {
                number(where, field, p.sagittal());
            }
        } else if (value instanceof FourNumbers m) {
            found.number(where.at(0), field, Unit.ONE, m.a());
            found.number(where.at(1), field, Unit.MM, m.b());
            found.number(where.at(2), field, Unit.PER_MM, m.c());
            found.number(where.at(3), field, Unit.ONE, m.d());
        }
    }

    private void number(Subject where, Field field, double si) {
        found.number(where, field, field.unit(), si);
    }
}
