/** Bytes to frames to values: text lines and a read-only Modbus RTU master. Never sees a port. */
package tunwarden.wire;
