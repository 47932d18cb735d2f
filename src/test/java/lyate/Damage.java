package lyate;

import java.util.List;
import java.util.Random;

/** Sound texts with a few letters put in, taken out, changed, doubled, or pieces of other texts put in. */
final class Damage {

    private final List<String> seeds;
    private final String letters;
    private final Random random;

    /**
     * @param seeds   sound texts
     * @param letters what may be put in
     * @param seed    the same damage for the same seed
     */
    Damage(List<String> seeds, String letters, long seed) {
        this.seeds = seeds;
        this.letters = letters;
        this.random = new Random(seed);
    }

    String next() {
        StringBuilder text = new StringBuilder(seed());
        for (int times = 1 + random.nextInt(4); times > 0; times--) {
            int place = random.nextInt(text.length() + 1);
            int end = Math.min(text.length(), place + random.nextInt(12));
            switch (random.nextInt(6)) {
                case 0 -> text.insert(place, letter());
                case 1 -> text.delete(place, Math.min(text.length(), place + 1));
                case 2 -> text.replace(place, Math.min(text.length(), place + 1), String.valueOf(letter()));
                case 3 -> text.insert(place, text.substring(place, end));
                case 4 -> text.delete(place, end);
                default -> text.insert(place, piece(seed()));
            }
        }
        return text.toString();
    }

    private String seed() {
        return seeds.get(random.nextInt(seeds.size()));
    }

    private char letter() {
        return letters.charAt(random.nextInt(letters.length()));
    }

    private String piece(String other) {
        int from = random.nextInt(other.length() + 1);
        return other.substring(from, Math.min(other.length(), from + random.nextInt(20)));
    }
}
