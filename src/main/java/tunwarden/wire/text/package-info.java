/** Text lines: cutting a byte stream into lines, proving them, taking the values out. */
package tunwarden.wire.text;
