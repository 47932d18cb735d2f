/** Judges a deprotonation step; start with {@link lyate.review.Reviewer}. */
package lyate.review;
