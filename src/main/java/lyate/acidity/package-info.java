/** Puts a pKa with a standard uncertainty on a proton site in a medium; start with {@link lyate.acidity.AcidityEstimator}. */
package lyate.acidity;
