/** Events looked for with the whole log in hand: what comes after a moment helps to judge it. */
package tunwarden.report.find;
