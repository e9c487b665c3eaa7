import type { ContainerType } from '@/shared/contracts/container-types';

/** What the form starts with for a new type; numbers are empty until they are read off the plate. */
export const newTypeValues = {
  code: '',
  name: '',
  kind: '' as never,
  lengthMm: null as never,
  widthMm: null as never,
  heightMm: null as never,
  tareKg: '',
  payloadKg: '',
  stackLimit: null as never,
  unitsPerStack: 1,
  graiAssetType: '',
  inServiceFrom: '',
  replacement: '',
  usefulLifeMonths: null as never,
  note: '',
  packedWith: [],
};

export const typeValues = (type: ContainerType) => ({
  name: type.name,
  kind: type.kind,
  lengthMm: type.lengthMm,
  widthMm: type.widthMm,
  heightMm: type.heightMm,
  tareKg: type.tareKg,
  payloadKg: type.payloadKg,
  stackLimit: type.stackLimit,
  unitsPerStack: type.unitsPerStack,
  graiAssetType: type.graiAssetType ?? '',
  inServiceFrom: type.inServiceFrom,
  replacement: type.replacement,
  usefulLifeMonths: type.usefulLifeMonths,
  note: type.note,
  packedWith: type.packedWith.map(({ code, quantity }) => ({ typeCode: code, quantity })),
  active: type.active,
});
