/**
 * The cellar file: TOML to validated records. Every fault names file, line and key, and several are
 * told at once.
 */
package tunwarden.config;
