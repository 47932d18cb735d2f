package lyate.review;

import java.util.List;
import java.util.function.Predicate;

/** A list of words of which one must fit; {@code !word} must not; a list without a plain word allows all others. */
final class Choice {

    private Choice() {}

    static boolean allows(List<String> words, Predicate<String> fits) {
        boolean anyPlain = false;
        boolean fitted = false;
        for (String word : words) {
            if (word.startsWith("!")) {
                if (fits.test(word.substring(1))) {
                    return false;
                }
            } else {
                anyPlain = true;
                fitted |= fits.test(word);
            }
        }
        return fitted || !anyPlain;
    }
}
