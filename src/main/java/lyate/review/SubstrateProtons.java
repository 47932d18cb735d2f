package lyate.review;

import java.util.ArrayList;
import java.util.List;
import lyate.acidity.SiteCoupling;
import lyate.flask.Coupling;
import lyate.flask.Flask;
import lyate.flask.ProtonHolder;
import lyate.flask.ProtonPlace;
import lyate.molecule.Molecule;

/**
 * The protons of a substrate as places of one holder: each equivalent atom is a place of its own, and every pair of places
 * is coupled, since a second proton near a charge costs more.
 */
final class SubstrateProtons {

    /** More places than this cost time and change nothing: the others are too weak to matter. */
    private static final int MOST_PLACES = 12;

    private final Molecule substrate;
    private final SiteCoupling coupling;
    private final List<Place> places = new ArrayList<>();

    /**
     * One proton.
     *
     * @param donor the site it belongs to
     * @param atom  the atom it sits on
     */
    private record Place(Donor donor, int atom) {}

    SubstrateProtons(Molecule substrate, SiteCoupling coupling, List<Donor> donors) {
        this.substrate = substrate;
        this.coupling = coupling;
        for (Donor donor : donors) {
            for (int atom : donor.site().equivalent()) {
                if (places.size() < MOST_PLACES) {
                    places.add(new Place(donor, atom));
                }
            }
        }
    }

    /** Whether there is no proton to give. */
    boolean isEmpty() {
        return places.isEmpty();
    }

    /** pKa units by which the loss of one site's proton raises the pKa of another, at the temperature of the step. */
    double raise(Donor gone, Donor other) {
        return coupling.shift(substrate, gone.site(), other.site(), gone.comparison().donor().medium()) * toTemperature(gone);
    }

    /**
     * The substrate with all its protons.
     *
     * @param reference where the working base stands on the axis of the flask
     */
    ProtonHolder holder(String name, double amount, double reference) {
        List<ProtonPlace> protons = places.stream().map(place -> new ProtonPlace(substrate.label(place.atom()),
                placed(reference - place.donor().effectiveLogK() + statistical(place.donor())))).toList();
        List<Coupling> couplings = new ArrayList<>();
        for (int one = 0; one < places.size(); one++) {
            for (int other = one + 1; other < places.size(); other++) {
                couplings.add(new Coupling(one, other, between(places.get(one), places.get(other))));
            }
        }
        return new ProtonHolder(name, amount, protons, couplings, protons.size());
    }

    /** Index of the places of a site within the holder; empty for a site too weak to be counted. */
    List<Integer> placesOf(Donor donor) {
        List<Integer> found = new ArrayList<>();
        for (int index = 0; index < places.size(); index++) {
            if (places.get(index).donor() == donor) {
                found.add(index);
            }
        }
        return found;
    }

    private double between(Place one, Place other) {
        return coupling.between(substrate, one.donor().site(), one.atom(), other.donor().site(), other.atom(),
                one.donor().comparison().donor().medium()).pKa() * toTemperature(one.donor());
    }

    /** The pKa of a site counts its equivalent atoms together; one atom alone is less acidic by log10 of their number. */
    private static double statistical(Donor donor) {
        return Math.log10(donor.site().equivalent().size());
    }

    private static double toTemperature(Donor donor) {
        return Flask.ROOM_KELVIN / donor.transfer().temperatureKelvin();
    }

    private static double placed(double pKa) {
        return Math.max(-ProtonPlace.PKA_LIMIT, Math.min(ProtonPlace.PKA_LIMIT, pKa));
    }
}
