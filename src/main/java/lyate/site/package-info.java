/** Finds every atom that can lose or gain a proton and says what kind it is; start with {@link lyate.site.SiteFinder}. */
package lyate.site;
