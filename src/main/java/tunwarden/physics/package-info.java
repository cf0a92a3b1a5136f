/**
 * The physics: one class per published correlation, named after it, SI inside. Each sub-package is
 * one subject; none knows of vessels, screens or files.
 */
package tunwarden.physics;
