package lyate.flask;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;

/** Flasks of every kind a chemist could and could not think of; the same ones for the same seed. */
final class RandomFlasks {

    private final SplittableRandom random;

    RandomFlasks(long seed) {
        this.random = new SplittableRandom(seed);
    }

    /** 1 to 14 places, pKa −10 to 60, amounts 1e-12 to 1e3, coupled or not. */
    Flask next() {
        return nextWithin(-12, 3);
    }

    /** As {@link #next()}, with amounts between two powers of ten. */
    Flask nextWithin(double lowestPower, double highestPower) {
        int places = random.nextInt(1, 15);
        List<ProtonHolder> holders = new ArrayList<>();
        while (places > 0) {
            int mine = random.nextInt(3) == 0 ? random.nextInt(1, places + 1) : 1;
            holders.add(holder("holder " + holders.size(), mine, lowestPower, highestPower));
            places -= mine;
        }
        return new Flask(holders, 298.15, "water");
    }

    /** A holder with random places, couplings and protons. */
    ProtonHolder holder(String name, int places, double lowestPower, double highestPower) {
        boolean stages = places > 1 && places <= 5 && random.nextInt(4) == 0;
        List<ProtonPlace> list = new ArrayList<>();
        for (int place = 0; place < places; place++) {
            list.add(new ProtonPlace("X" + (place + 1), pKa(), stages ? place - 1 : ProtonPlace.ANY_ORDER));
        }
        List<Coupling> couplings = new ArrayList<>();
        for (int first = 0; first < places && !stages; first++) {
            for (int second = first + 1; second < places; second++) {
                if (random.nextBoolean()) {
                    couplings.add(new Coupling(first, second, random.nextDouble(-1, 6)));
                }
            }
        }
        double held = random.nextInt(5) == 0 ? random.nextDouble(places) : random.nextInt(places + 1);
        return new ProtonHolder(name, amount(lowestPower, highestPower), list, couplings, held);
    }

    /** Round amounts half of the time, so that exact stoichiometry is common. */
    double amount(double lowestPower, double highestPower) {
        return random.nextBoolean() ? random.nextInt(1, 5) * Math.pow(10, random.nextInt((int) Math.ceil(lowestPower), (int) highestPower))
                : Math.pow(10, random.nextDouble(lowestPower, highestPower));
    }

    /** Whole numbers half of the time, so that ties are common. */
    double pKa() {
        return random.nextBoolean() ? random.nextInt(-10, 61) : random.nextDouble(-10, 60);
    }

    SplittableRandom random() {
        return random;
    }
}
