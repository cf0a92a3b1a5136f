/** What would have happened: a log rerun from its estimated state with something changed. */
package tunwarden.report.otherwise;
