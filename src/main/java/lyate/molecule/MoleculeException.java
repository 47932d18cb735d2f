package lyate.molecule;

/** A structure could not be used; the message says where and why in words for the person who gave it. */
public final class MoleculeException extends Exception {

    private static final long serialVersionUID = 1L;

    public MoleculeException(String message) {
        super(message);
    }
}
