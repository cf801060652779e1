package twofold.layout;

import java.util.Optional;
import twofold.design.Aperture;
import twofold.design.Crystal;
import twofold.design.FaceAngle;
import twofold.design.Glass;
import twofold.design.Lens;
import twofold.design.Matrix;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Plate;
import twofold.design.Problem;
import twofold.design.Slab;
import twofold.design.Subject;
import twofold.design.TiltPlane;
import twofold.design.Unit;
import twofold.material.Material;
import twofold.material.Materials;
import twofold.optics.Refraction;

/** What a part's glass and faces come to at a design's wavelength. */
final class Glazing {
    private final double wavelength;
    private final Materials materials;

    Glazing(double wavelength, Materials materials) {
        this.wavelength = wavelength;
        this.materials = materials;
    }

    /** What is wrong with a part's glass. */
    Optional<Problem> problem(int part, Part what) {
        Glass glass = glass(what);
        if (glass.index().isPresent() || glass.material().isEmpty()) {
            return Optional.empty();
        }
        String name = glass.material().get();
        Subject where = Subject.part(part).at("material");
        Optional<Material> material = materials.find(name);
        if (material.isEmpty()) {
            return Optional.of(new Problem(
                    where,
                    "found \"" + name + "\"" + twofold.design.Names.hint(name, materials.names()),
                    String.join(", ", materials.names())));
        }
        Material m = material.get();
        if (!m.covers(wavelength)) {
            return Optional.of(new Problem(
                    where,
                    "found \"" + name + "\" at " + Unit.NM.text(wavelength) + " nm, outside the range of its fit",
                    "a wavelength from " + Unit.NM.text(m.from()) + " to " + Unit.NM.text(m.to())
                            + " nm, or an index"));
        }
        return Optional.empty();
    }

    private static Glass glass(Part what) {
        return what.match(new Part.Cases<Glass>() {
            @Override
            public Glass mirror(Mirror mirror) {
                return Glass.NONE;
            }

            @Override
            public Glass lens(Lens lens) {
                return lens.glass();
            }

            @Override
            public Glass plate(Plate plate) {
                return plate.slab().glass();
            }

            @Override
            public Glass crystal(Crystal crystal) {
                return crystal.slab().glass();
            }

            @Override
            public Glass aperture(Aperture aperture) {
                return Glass.NONE;
            }

            @Override
            public Glass matrix(Matrix matrix) {
                return Glass.NONE;
            }
        });
    }

    private double index(Glass glass) {
        if (glass.index().isPresent()) {
            return glass.index().getAsDouble();
        }
        return glass.material()
                .flatMap(materials::find)
                .map(m -> m.index(wavelength))
                .orElse(1.0);
    }

    /** The part at path 0 of its leg: everything but its place, which the leg's path may decide. */
    Standing standing(int part, Part what) {
        return what.match(new Part.Cases<Standing>() {
            @Override
            public Standing mirror(Mirror mirror) {
                throw new IllegalArgumentException("a mirror stands on no leg");
            }

            @Override
            public Standing lens(Lens lens) {
                return new Standing(part, 0, 0, index(lens.glass()), lens.tilt(), 0, 0, 0, 0);
            }

            @Override
            public Standing plate(Plate plate) {
                double n = index(plate.slab().glass());
                double inside = plate.thickness()
                        / Refraction.cosInside(n, incidence(plate.slab().faces(), n));
                return slab(plate.slab(), inside);
            }

            @Override
            public Standing crystal(Crystal crystal) {
                return slab(crystal.slab(), crystal.length());
            }

            private Standing slab(Slab slab, double length) {
                double n = index(slab.glass());
                double incidence = incidence(slab.faces(), n);
                double turn = slab.side().sign() * Refraction.turn(n, incidence);
                double across = length * Math.sin(turn);
                boolean tangential = slab.tiltPlane() == TiltPlane.TANGENTIAL;
                return new Standing(
                        part,
                        0,
                        length,
                        n,
                        incidence,
                        turn,
                        tangential ? across : 0,
                        tangential ? 0 : across,
                        length * Math.cos(turn));
            }

            @Override
            public Standing aperture(Aperture aperture) {
                return new Standing(part, 0, 0, 1, 0, 0, 0, 0, 0);
            }

            @Override
            public Standing matrix(Matrix matrix) {
                return new Standing(part, 0, matrix.length(), 1, 0, 0, 0, 0, matrix.length());
            }
        });
    }

    private static double incidence(FaceAngle faces, double index) {
        return faces.atBrewster() ? Refraction.brewster(index) : faces.incidence();
    }
}
