/** The narrow way to the disk, so that tests can make it short, slow, full or broken. */
package tunwarden.journal.disk;
