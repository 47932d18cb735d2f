package lyate.review;

import lyate.stock.Named;

/** Something of the stockroom and what it would do in a step. */
public sealed interface Ranked permits RankedBase, RankedAcid {

    /** The base or acid. */
    Named reagent();

    /** What it would do. */
    Judgement judgement();

    /** Whether it would do the job. */
    boolean suits();

    /** One line: why it stands where it stands. */
    String why();
}
