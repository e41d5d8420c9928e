import type { Preset } from './presets.ts';

const READING = 'nose 030.0° true, 10.0° up, right wing 20.0° down';

/**
 * Conventions of open standards, as far as facets state them fully. `checked` says whether the entry was compared with
 * the standard's text; one from memory must be confirmed before it is relied on.
 */
export const STANDARD_PRESETS: readonly Preset[] = [
  {
    id: 'iso-1151-euler-rad', title: 'Azimuth, inclination, bank in radians', description: 'Angles from the normal earth-fixed axes to the body axes, azimuth first.',
    standard: { name: 'ISO 1151-1', clause: 'axis systems 1.1, angles 1.2', checked: 'from memory', note: 'The normal earth-fixed x axis need not point north; here it does.' },
    convention: { representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', unit: 'rad', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' },
    worked: { reading: READING, numbers: [0.5235987755982989, 0.17453292519943295, 0.3490658503988659] },
  },
  {
    id: 'mavlink-attitude', title: 'Roll, pitch, yaw of ATTITUDE', description: 'Three angles in radians, roll first, from local north-east-down to forward-right-down.',
    standard: { name: 'MAVLink common message set', clause: 'ATTITUDE, message 30', checked: 'confirmed', note: 'The rates beside the angles are body rates in practice; the message text leaves it open.' },
    convention: { representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', unit: 'rad', order: [3, 2, 1], signs: [1, 1, 1], range: 'signed' },
    worked: { reading: READING, numbers: [0.3490658503988659, 0.17453292519943295, 0.5235987755982989] },
  },
  {
    id: 'mavlink-attitude-quaternion', title: 'Quaternion of ATTITUDE_QUATERNION', description: 'Scalar first, q1 to q4 are w, x, y, z, from body to local north-east-down.',
    standard: { name: 'MAVLink common message set', clause: 'ATTITUDE_QUATERNION, message 31', checked: 'confirmed', note: 'With repr_offset_q set, the attitude has to be composed with it first.' },
    convention: { representation: 'quaternion', reference: 'NED', body: 'FRD', scalar: 'first', product: 'hamilton', maps: 'body-to-reference', sign: 'any' },
    worked: { reading: READING, numbers: [0.9515485246437886, 0.14487812541736916, 0.12767944069578066, 0.23929833774473033] },
  },
  {
    id: 'ros-orientation', title: 'Orientation quaternion', description: 'Scalar last, from the body (forward-left-up) to the world (east-north-up). Its zero points east.',
    standard: { name: 'ROS REP-103 and REP-145', clause: 'Axis Orientation, Rotation Representation; Orientation', checked: 'confirmed', note: 'Frames whose name ends in _ned are north-east-down instead.' },
    convention: { representation: 'quaternion', reference: 'ENU', body: 'FLU', scalar: 'last', product: 'hamilton', maps: 'body-to-reference', sign: 'any' },
    worked: { reading: READING, numbers: [0.192727303262309, 0.012161306594124708, 0.50363693705771, 0.8420558917496451] },
  },
  {
    id: 'ros-roll-pitch-yaw', title: 'Fixed-axis roll, pitch, yaw', description: 'Rotations about the fixed x, y, z axes of the world in radians, between east-north-up and forward-left-up. Pitch is positive nose down.',
    standard: { name: 'ROS REP-103', clause: 'Rotation Representation', checked: 'confirmed' },
    convention: { representation: 'euler', reference: 'ENU', body: 'FLU', sequence: 'XYZ', motion: 'extrinsic', unit: 'rad', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' },
    worked: { reading: READING, numbers: [0.3490658503988659, -0.17453292519943295, 1.0471975511965979] },
  },
  {
    id: 'geopose-basic-ypr', title: 'Yaw, pitch, roll of Basic-YPR', description: 'Degrees about the turned z, y, x axes, from the local east-north-up plane to a body whose x points forward and y left.',
    standard: { name: 'OGC GeoPose 1.0 (21-056r11)', clause: 'Basic-YPR', checked: 'confirmed', note: 'Two published example instances hold radians about z, x, y instead (tests/reference, geopose-00-pair).' },
    convention: { representation: 'euler', reference: 'ENU', body: 'FLU', sequence: 'ZYX', motion: 'intrinsic', unit: 'deg', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' },
    worked: { reading: READING, numbers: [60, -10, 20] },
  },
  {
    id: 'ccsds-aem-quaternion', title: 'Quaternion Q1, Q2, Q3, QC', description: 'Scalar last, frame A local north-east-down, frame B forward-right-down, direction A to B.',
    standard: { name: 'CCSDS 504.0-B (ISO 13541)', clause: 'attitude data, QUATERNION', checked: 'confirmed', note: 'Frames are named in each message; the letters here stand for one choice. Version 1 messages may state the scalar first.' },
    convention: { representation: 'quaternion', reference: 'NED', body: 'FRD', scalar: 'last', product: 'hamilton', maps: 'body-to-reference', sign: 'any' },
    worked: { reading: READING, numbers: [0.14487812541736916, 0.12767944069578066, 0.23929833774473033, 0.9515485246437886] },
  },
  {
    id: 'w3c-orientation-sensor', title: 'Quaternion of an orientation sensor', description: 'Scalar last, from the device (x right, y top edge, z out of the screen) to east-north-up. The device lies flat, its top edge forward.',
    standard: { name: 'W3C Orientation Sensor', clause: 'quaternion attribute', checked: 'confirmed', note: 'North is magnetic. The standard’s matrix example is listed by rows though described by columns (tests/reference, w3c-orientation-sensor-matrix).' },
    convention: { representation: 'quaternion', reference: 'ENU', body: 'RFU', scalar: 'last', product: 'hamilton', maps: 'body-to-reference', sign: 'any' },
    worked: { reading: READING, numbers: [0.12767944069578066, 0.14487812541736916, -0.23929833774473033, 0.9515485246437886] },
  },
  {
    id: 'iso-8855-euler-rad', title: 'Yaw, pitch, roll of a road vehicle', description: 'Radians about the turned z, y, x axes, from earth-fixed axes (x east, y north, z up) to forward-left-up. Pitch is positive nose down.',
    standard: { name: 'ISO 8855:2011', clause: 'axis systems 2, angular orientation 5.2', checked: 'from memory', note: 'The earth-fixed x axis may point anywhere; here east, as ASAM OpenDRIVE has it.' },
    convention: { representation: 'euler', reference: 'ENU', body: 'FLU', sequence: 'ZYX', motion: 'intrinsic', unit: 'rad', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' },
    worked: { reading: READING, numbers: [1.0471975511965979, -0.17453292519943295, 0.3490658503988659] },
  },
];
