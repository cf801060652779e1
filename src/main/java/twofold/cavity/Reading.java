package twofold.cavity;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Aperture;
import twofold.design.Bound;
import twofold.design.Crystal;
import twofold.design.Edge;
import twofold.design.Lens;
import twofold.design.Matrix;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Planes;
import twofold.design.Plate;
import twofold.design.Problem;
import twofold.design.Quantity;
import twofold.design.Requirement;
import twofold.layout.Box;
import twofold.layout.Laid;
import twofold.optics.Plane;

/**
 * A quantity compiled against a chain: what it comes to in any trial of that chain, in SI. Reading optics allocates
 * nothing; zones, clearances and the plan's box may.
 */
public interface Reading {
    /**
     * The value in SI. NaN where it is undefined: where a plane that it needs has no beam, where no such edge of a zone
     * exists, and where the trial's last run did not fit.
     *
     * @param trial of the chain that this reading was made for, after a run
     */
    double of(Trial trial);

    /**
     * How a quantity is read.
     *
     * @param what the quantity
     * @param at where; empty for the whole cavity
     * @param plane of a quantity that has one
     * @param edge of a quantity that needs one
     * @param chain whose trials are read
     * @throws IllegalArgumentException with words where the quantity cannot be read so
     */
    static Reading of(Quantity what, Optional<Place> at, Optional<Plane> plane, Optional<Edge> edge, Chain chain) {
        Optional<Planes> planes = plane.map(p -> p == Plane.TANGENTIAL ? Planes.TANGENTIAL : Planes.SAGITTAL);
        List<Problem> problems = chain.laid()
                .design()
                .problems(new Requirement(what, at, planes, edge, Bound.Prefer.LARGEST, Optional.empty()));
        if (!problems.isEmpty()) {
            throw new IllegalArgumentException(
                    problems.get(0).found() + "; accepted: " + problems.get(0).accepted());
        }
        // What is absent was allowed to be; these stand in, unread.
        Plane p = plane.orElse(Plane.SAGITTAL);
        Place place = at.orElse(Place.of(chain.laid().design().parts().get(0).name()));
        return switch (what) {
            case HALF_TRACE -> t -> t.halfTrace(p);
            case STABILITY_MARGIN -> t -> t.margin(p);
            case GOUY -> t -> t.hasBeam(p) ? t.gouy(p) : Double.NaN;
            case RADIUS -> radius(chain.part(place.first()), p);
            case WAIST_RADIUS -> {
                Stretch stretch = Stretch.at(chain, place);
                yield t -> t.hasBeam(p) ? stretch.radius(t, p) : Double.NaN;
            }
            case WAIST_OFFSET -> {
                Stretch stretch = Stretch.at(chain, place);
                yield t -> t.hasBeam(p) ? stretch.offset(t, p) : Double.NaN;
            }
            case WAIST_OFFSET_RAYLEIGHS -> {
                Stretch stretch = Stretch.at(chain, place);
                yield t -> t.hasBeam(p) ? stretch.offset(t, p) / stretch.rayleigh(t, p) : Double.NaN;
            }
            case WAIST_SPLIT -> {
                Stretch stretch = Stretch.at(chain, place);
                yield t -> hasBeams(t)
                        ? stretch.after(t, Plane.TANGENTIAL) - stretch.after(t, Plane.SAGITTAL)
                        : Double.NaN;
            }
            case ROUNDNESS -> {
                if (place.second().isEmpty()) {
                    int part = chain.part(place.first());
                    yield t -> roundness(t, t.radius(part, Plane.TANGENTIAL), t.radius(part, Plane.SAGITTAL));
                }
                Stretch stretch = Stretch.at(chain, place);
                yield t -> roundness(t, stretch.radius(t, Plane.TANGENTIAL), stretch.radius(t, Plane.SAGITTAL));
            }
            case FOCUS_RATIO -> {
                Stretch stretch = Stretch.at(chain, place);
                yield t -> t.hasBeam(p) ? t.numbers.inside(stretch.slab()) / (2 * stretch.rayleigh(t, p)) : Double.NaN;
            }
            case ZONE_EDGE_SPLIT -> {
                int leg = chain.leg(place);
                Edge which = edge.orElse(Edge.LOWER);
                yield t -> {
                    ZoneSearch search = new ZoneSearch(t, leg);
                    return search.zones(Plane.SAGITTAL)
                            .here()
                            .flatMap(z -> z.edge(which))
                            .map(e -> Zones.split(search.zones(Plane.TANGENTIAL), e))
                            .orElse(Double.NaN);
                };
            }
            case ZONE_OVERLAP -> {
                int leg = chain.leg(place);
                yield t -> {
                    ZoneSearch search = new ZoneSearch(t, leg);
                    return Zones.overlap(search.zones(Plane.TANGENTIAL), search.zones(Plane.SAGITTAL));
                };
            }
            case INCIDENCE -> {
                int mirror = chain.part(place.first());
                yield t -> t.legs.incidence(mirror);
            }
            case LEG -> {
                int leg = chain.leg(place);
                yield t -> t.pathOf(leg);
            }
            case DISTANCE -> {
                int leg = chain.leg(place);
                yield t -> t.legs.distance(leg);
            }
            case ROUND_TRIP -> t -> t.legs.roundTrip();
            case FSR -> t -> Cavity.LIGHT / t.legs.opticalRoundTrip();
            case CLEARANCE -> clearance(at.map(Place::first).map(chain::part));
            case CLIP_LOSS ->
                clipLoss(
                        chain.part(place.first()), chain.laid().design().parts().get(chain.part(place.first())));
            case PLAN_WIDTH -> t -> t.laid().map(Box::of).map(Box::width).orElse(Double.NaN);
            case PLAN_DEPTH -> t -> t.laid().map(Box::of).map(Box::depth).orElse(Double.NaN);
        };
    }

    private static boolean hasBeams(Trial t) {
        return t.hasBeam(Plane.TANGENTIAL) && t.hasBeam(Plane.SAGITTAL);
    }

    private static Reading radius(int part, Plane plane) {
        return t -> t.hasBeam(plane) ? t.radius(part, plane) : Double.NaN;
    }

    private static double roundness(Trial t, double tangential, double sagittal) {
        return hasBeams(t) ? Math.min(tangential, sagittal) / Math.max(tangential, sagittal) : Double.NaN;
    }

    private static Reading clearance(Optional<Integer> part) {
        return t -> {
            Optional<Laid> laid = t.hasBeam(Plane.TANGENTIAL) ? t.laid() : Optional.empty();
            return laid.map(l -> new Solver(l, t).clearance())
                    .flatMap(c -> part.isPresent()
                            ? c.smallestOf(part.get())
                            : c.smallest(1).stream().findFirst())
                    .map(gap -> gap.gap())
                    .orElse(Double.NaN);
        };
    }

    private static Reading clipLoss(int part, Part what) {
        Reading loss = what.match(new Part.Cases<Reading>() {
            @Override
            public Reading mirror(Mirror mirror) {
                return hole(mirror.clearDiameter(), Face.SURFACE);
            }

            @Override
            public Reading lens(Lens lens) {
                return clear(lens.clear(), Face.SURFACE);
            }

            @Override
            public Reading plate(Plate plate) {
                return clear(plate.slab().clear(), Face.EXIT);
            }

            @Override
            public Reading crystal(Crystal crystal) {
                return clear(crystal.slab().clear(), Face.EXIT);
            }

            @Override
            public Reading aperture(Aperture aperture) {
                if (aperture.hole().isPresent()) {
                    return hole(aperture.hole().getAsDouble(), Face.SURFACE);
                }
                Reading tangential = slit(aperture.slitTangential(), Plane.TANGENTIAL);
                Reading sagittal = slit(aperture.slitSagittal(), Plane.SAGITTAL);
                return t -> Clipping.both(tangential.of(t), sagittal.of(t));
            }

            @Override
            public Reading matrix(Matrix matrix) {
                return t -> 0;
            }

            private Reading clear(OptionalDouble diameter, Face last) {
                return diameter.isPresent() ? hole(diameter.getAsDouble(), last) : t -> 0;
            }

            private Reading hole(double diameter, Face last) {
                double radius = diameter / 2;
                Reading atLast = t -> outside(t, radius, last);
                return last == Face.EXIT ? t -> Math.max(outside(t, radius, Face.ENTRY), atLast.of(t)) : atLast;
            }

            private double outside(Trial t, double radius, Face face) {
                return Clipping.hole(
                        radius, t.footprint(part, face, Plane.TANGENTIAL), t.footprint(part, face, Plane.SAGITTAL));
            }

            private Reading slit(OptionalDouble width, Plane plane) {
                if (width.isEmpty()) {
                    return t -> 0;
                }
                double half = width.getAsDouble() / 2;
                return t -> Clipping.slit(half, t.footprint(part, Face.SURFACE, plane));
            }
        });
        return t -> hasBeams(t) ? loss.of(t) : Double.NaN;
    }
}
