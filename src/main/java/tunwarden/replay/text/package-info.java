/** Characters to lines, fields, numbers and times, without garbage per row and without a guess. */
package tunwarden.replay.text;
