/**
 * The report: one page of HTML that another engineer can check and sign, needing no other file.
 *
 * <p>May not know the command line.
 */
package tepor.viewer.report;
