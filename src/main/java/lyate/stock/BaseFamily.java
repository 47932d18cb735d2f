package lyate.stock;

/**
 * What the bases of one kind have in common: a row of {@code base-families.csv}.
 *
 * @param id           for example {@code organolithium}
 * @param name         what a chemist calls it
 * @param irreversible whether protonation cannot be undone in the flask: the conjugate acid leaves as a gas or is an
 *                     alkane or arene
 * @param insoluble    whether the base reacts from a solid, so that its strength in solution is only nominal
 * @param strong       whether the DMSO scale decides (see docs/science.md); the others are judged on the aqueous scale
 * @param hindered     whether it takes the more accessible proton first at low temperature
 * @param source       citation
 */
public record BaseFamily(String id, String name, boolean irreversible, boolean insoluble, boolean strong,
                         boolean hindered, String source) {}
