/**
 * What to weigh and measure out, what is given off, and how to stop the reaction; start with {@link lyate.bench.Amounts}.
 */
package lyate.bench;
