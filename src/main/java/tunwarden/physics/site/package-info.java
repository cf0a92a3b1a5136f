/** Where a vessel stands: the atmosphere around it. */
package tunwarden.physics.site;
