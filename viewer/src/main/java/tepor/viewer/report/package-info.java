/** The report: one page of HTML that another engineer can check. */
package tepor.viewer.report;
