/**
 * The command line. The only package that prints and sets the exit status.
 *
 * <p>{@code Main} is the process, {@code CommandRun} one call of it; commands hand their work to a {@code Calculation} and
 * write what it answers.
 */
package tepor.viewer.command;
