import type { Preset } from '../contract';
import type { Values } from './schema';

export const presets: readonly Preset<Values>[] = [
  {
    id: 'receiver-box-lid',
    name: 'Receiver-box lid hinge',
    purpose: 'Joins a lid to a receiver box; opened at every field day, drawn by the first fold.',
    material: 'pp',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: { leafLength: 14, leafWidth: 40, webLength: 3, webThickness: 0.4, webFillet: 0.4 },
  },
  {
    id: 'rudder-hinge',
    name: 'Rudder hinge strip',
    purpose: 'Long thin control-surface hinge, 35 degrees each way, glued through its holes.',
    material: 'tpu-95a',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: {
      leafLength: 8,
      leafWidth: 120,
      leafThickness: 1,
      webThickness: 0.4,
      webLength: 2,
      webFillet: 0.3,
      foldAngle: 35,
      holeCount: 10,
      holeDiameter: 2,
    },
  },
  {
    id: 'boat-hatch-flap',
    name: 'Boat hatch flap',
    purpose: 'A flap of PETG that opens by 90 degrees; the long web keeps it elastic.',
    material: 'petg',
    use: { opening: 'sometimes', layers: 'along', temperature: 30 },
    values: {
      leafLength: 25,
      leafWidth: 35,
      webLength: 34,
      webThickness: 0.4,
      webFillet: 0.4,
      foldAngle: 90,
    },
  },
  {
    id: 'tool-case-lid',
    name: 'Tool case lid, shut flat',
    purpose: 'Lid and case come face to face; the web is recessed so that it has room.',
    material: 'pp',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: {
      leafLength: 30,
      leafWidth: 80,
      leafThickness: 3,
      webThickness: 0.4,
      webLength: 3,
      webRelief: 0.6,
      webFillet: 0.5,
      closing: 'shut',
      holeCount: 3,
    },
  },
];
