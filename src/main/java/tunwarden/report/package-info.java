/** The incident report: HTML with plots, JSON, series. */
package tunwarden.report;
