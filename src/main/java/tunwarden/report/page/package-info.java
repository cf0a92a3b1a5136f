/** The report as one HTML file that needs nothing else: text, tables, and plots drawn as SVG. */
package tunwarden.report.page;
