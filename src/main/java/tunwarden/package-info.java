/** Tunwarden: watches the gas above drink kept under pressure. One sub-package per floor room. */
package tunwarden;
