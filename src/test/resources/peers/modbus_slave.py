"""A Modbus RTU slave by pymodbus, as an independent peer: modbus_slave.py PORT

Unit 5, holding registers 0..3: 0.873 and 5.25 as float32, high word first; input registers 0, 1: 873
and 525. Register 100 and beyond do not exist.
"""
import struct
import sys

from pymodbus.datastore import ModbusSequentialDataBlock, ModbusServerContext, ModbusSlaveContext
from pymodbus.server import StartSerialServer
from pymodbus.transaction import ModbusRtuFramer

floats = list(struct.unpack(">4H", struct.pack(">2f", 0.873, 5.25)))
unit = ModbusSlaveContext(
    di=ModbusSequentialDataBlock(0, [0, 1, 0, 1]),
    co=ModbusSequentialDataBlock(0, [1, 0, 1, 0]),
    hr=ModbusSequentialDataBlock(0, floats + [0] * 90),
    ir=ModbusSequentialDataBlock(0, [873, 525] + [0] * 90),
    zero_mode=True,
)
context = ModbusServerContext(slaves={5: unit}, single=False)
print("ready", flush=True)
StartSerialServer(
    context=context, framer=ModbusRtuFramer, port=sys.argv[1], baudrate=19200, timeout=0.05
)
