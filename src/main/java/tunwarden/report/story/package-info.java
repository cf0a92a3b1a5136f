/** What happened, in words: summary, causes with evidence for and against, what is not known. */
package tunwarden.report.story;
