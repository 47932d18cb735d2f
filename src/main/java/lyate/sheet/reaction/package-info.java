/** Reactions in: which reactant loses its proton at which atom. {@link lyate.sheet.reaction.ReactionReader} is the way in. */
package lyate.sheet.reaction;
