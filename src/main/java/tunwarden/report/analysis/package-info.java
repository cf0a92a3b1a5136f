/** One pass over one vessel's log and what is kept of it, in bounded memory; the backward look. */
package tunwarden.report.analysis;
