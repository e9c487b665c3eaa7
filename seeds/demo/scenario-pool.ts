import type { Stretch } from '@/shared/contracts/pool-sizing';

/** Packing specifications for the pool's demand. */
export const parts = [
  {
    number: 'HX-2210',
    name: 'heat exchanger coil',
    typeCode: 'TOTE-64',
    supplier: 'KESTREL',
    plant: 'TARNBY',
    unitsPerContainer: 12,
    mean: '1920',
    sd: '260',
  },
  {
    number: 'BR-1145',
    name: 'bracket set',
    typeCode: 'TOTE-64',
    supplier: 'ORRIN',
    plant: 'TARNBY',
    unitsPerContainer: 10,
    mean: '320',
    sd: '60',
  },
  {
    number: 'VB-3007',
    name: 'valve body',
    typeCode: 'TOTE-64',
    supplier: 'VALE',
    plant: 'OSTREL',
    unitsPerContainer: 20,
    mean: '640',
    sd: '110',
  },
  {
    number: 'HS-0417',
    name: 'housing shell',
    typeCode: 'BOX-1210',
    supplier: 'BRAMBLE',
    plant: 'TARNBY',
    unitsPerContainer: 16,
    mean: '150',
    sd: '30',
  },
  {
    number: 'CP-0820',
    name: 'scroll compressor',
    typeCode: 'RACK-CP',
    supplier: 'SUNDHOLM',
    plant: 'OSTREL',
    unitsPerContainer: 8,
    mean: '72',
    sd: '11',
  },
  {
    number: 'FA-1100',
    name: 'fastener kit',
    typeCode: 'TOTE-43',
    supplier: 'PALLWICK',
    plant: 'TARNBY',
    unitsPerContainer: 200,
    mean: '24800',
    sd: '4100',
  },
  {
    number: 'PN-3306',
    name: 'side panel',
    typeCode: 'BOX-1210',
    supplier: 'ORRIN',
    plant: 'TARNBY',
    unitsPerContainer: 24,
    mean: '260',
    sd: '45',
  },
  {
    number: 'EC-5012',
    name: 'controller board',
    typeCode: 'TOTE-43',
    supplier: 'MAREN',
    plant: 'OSTREL',
    unitsPerContainer: 30,
    mean: '930',
    sd: '140',
  },
] as const;

/** The loop of each type with demand; working days with the waits for the next truck in them, invented. */
export const loops: Readonly<
  Record<
    string,
    {
      travel: 'independent' | 'together';
      bufferDays: string;
      legs: readonly (readonly [name: string, stretch: Stretch, mean: number, sd: number])[];
    }
  >
> = {
  'TOTE-64': {
    travel: 'together',
    bufferDays: '6',
    legs: [
      ['filled at the supplier', 'at the partner', 7, 2],
      ['on the way to the plant', 'to the plant', 1.1, 0.3],
      ['full stock at the plant', 'at the plant', 5, 2],
      ['at the line', 'at the plant', 0.5, 0.1],
      ['empties at the plant', 'at the plant', 8, 2.5],
      ['on the way back', 'back', 1.1, 0.3],
    ],
  },
  'TOTE-43': {
    travel: 'together',
    bufferDays: '4',
    legs: [
      ['filled at the supplier', 'at the partner', 6, 2],
      ['on the way to the plant', 'to the plant', 1, 0.3],
      ['full stock at the plant', 'at the plant', 5, 2],
      ['at the line', 'at the plant', 0.5, 0.2],
      ['empties at the plant', 'at the plant', 5, 2],
      ['on the way back', 'back', 1, 0.3],
    ],
  },
  'BOX-1210': {
    travel: 'independent',
    bufferDays: '5',
    legs: [
      ['filled at the supplier', 'at the partner', 7, 2],
      ['on the way to the plant', 'to the plant', 1.2, 0.4],
      ['full stock at the plant', 'at the plant', 5, 2],
      ['at the line', 'at the plant', 1, 0.3],
      ['empties at the plant', 'at the plant', 8, 3],
      ['on the way back', 'back', 1.5, 0.5],
    ],
  },
  'RACK-CP': {
    travel: 'together',
    bufferDays: '3',
    legs: [
      ['filled at the supplier', 'at the partner', 5, 1.5],
      ['on the way to the plant', 'to the plant', 1, 0.3],
      ['full stock at the plant', 'at the plant', 5, 1.5],
      ['at the line', 'at the plant', 0.5, 0.1],
      ['empties at the plant', 'at the plant', 7, 2],
      ['on the way back', 'back', 1, 0.3],
    ],
  },
};
