/**
 * What is in the flask, how much, and where its protons are once they have settled; start with
 * {@link lyate.flask.ProtonBalance}. Pure numbers: this package knows no table and no molecule.
 */
package lyate.flask;
