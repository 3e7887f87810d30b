/** The command line. The only package that prints and sets the exit status. */
package tepor.viewer.command;
