/** What a device profile says, as validated records: line, framing, fields and their faults. */
package tunwarden.wire.profile;
