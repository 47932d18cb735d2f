/** The command line; start with {@link lyate.command.Lyate}. */
package lyate.command;
