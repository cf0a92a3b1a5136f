/** What the liquid held, told with the whole log in hand: what came later explains what was. */
package tunwarden.report.hindsight;
