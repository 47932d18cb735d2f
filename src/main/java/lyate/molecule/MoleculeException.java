package lyate.molecule;

import java.util.OptionalInt;

/** A structure could not be used; the message says where and why in words for the person who gave it. */
public final class MoleculeException extends Exception {

    private static final long serialVersionUID = 1L;

    private final int inputNumber;

    public MoleculeException(String message) {
        this(message, 0);
    }

    /**
     * @param message     what is wrong, in words
     * @param inputNumber the atom it is about, 1-based in the order of the input; 0 where no one atom is
     */
    MoleculeException(String message, int inputNumber) {
        super(printable(message));
        this.inputNumber = inputNumber;
    }

    /** What the user gave is quoted in messages; its control characters must not reach a terminal. */
    private static String printable(String message) {
        return message.replace('\t', ' ').replaceAll("[\\p{Cntrl}&&[^\n]]", "\uFFFD");
    }

    /** The atom it is about, 1-based in the order of the input. */
    public OptionalInt inputNumber() {
        return inputNumber > 0 ? OptionalInt.of(inputNumber) : OptionalInt.empty();
    }
}
