package lyate.window;

import java.util.List;
import lyate.stock.Base;
import lyate.stock.Solvent;
import lyate.stock.UnknownNameException;

/** What there is to choose from. */
interface Shelf {

    List<Base> bases();

    List<Solvent> solvents();

    /** By name, abbreviation or formula. */
    Base base(String name) throws UnknownNameException;

    /** By name or abbreviation. */
    Solvent solvent(String name) throws UnknownNameException;
}
