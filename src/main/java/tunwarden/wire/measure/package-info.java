/** From a raw number and what the profile says of it to a judged value and a sample. */
package tunwarden.wire.measure;
