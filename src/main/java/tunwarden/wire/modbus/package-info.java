/** A Modbus RTU master that can only read: function codes 1 to 4. */
package tunwarden.wire.modbus;
