/** @typedef {import('./camera.mjs').Camera} Camera */

/** Ids of the demo that addresses need, by asking the product. */
const firstOf = async (/** @type {Camera} */ camera, /** @type {string} */ path) => {
  const { rows } = await camera.get(path);
  if (!rows?.length) throw new Error(`${path} has no rows to show`);
  return rows[0];
};

/**
 * Every screen by the person who uses it most.
 * @type {Record<string, (camera: Camera) => Promise<string[]>>}
 */
export const screensByPerson = {
  'ane@fennmark.example': async (camera) => {
    const { id } = await firstOf(camera, '/shipments?state=differs');
    const toCount = await firstOf(camera, '/shipments?state=on%20the%20way&direction=in');
    const difference = await firstOf(camera, '/differences?kind=fewer');
    const dispute = await firstOf(camera, '/disputes');
    const balance = await firstOf(camera, '/balances');
    return [
      '/',
      '/shipments',
      '/shipments/send',
      `/shipments/${id}`,
      `/shipments/${toCount.id}/count`,
      '/balances',
      `/balances/${balance.companyId}/${balance.typeCode}`,
      '/balances/adjust',
      '/differences',
      `/differences/${difference.id}`,
      '/disputes',
      `/disputes/${dispute.id}`,
      '/imports',
      '/imports/new',
    ];
  },
  'inge@kestrel.example': async (camera) => {
    const toCount = await firstOf(camera, '/shipments?state=on%20the%20way&direction=in');
    const counted = await firstOf(camera, '/shipments?state=counted');
    return [
      '/',
      '/shipments',
      '/shipments/send',
      `/shipments/${toCount.id}/count`,
      `/shipments/${counted.id}/dispute`,
      '/balances',
      '/disputes',
      '/container-types/TOTE-64',
      '/more',
      '/account',
    ];
  },
  'rasmus@kestrel.example': async (camera) => {
    const { id } = await firstOf(camera, '/statements');
    return ['/', '/statements', `/statements/${id}`, `/statements/${id}/movements`, '/terms', '/people'];
  },
  'mikkel@fennmark.example': async (camera) => {
    const { id, month, partner } = await firstOf(camera, '/statements?answer=disputed');
    return [
      '/',
      '/statements',
      `/statements/${id}`,
      '/terms',
      `/terms/${partner.id}`,
      `/terms/${partner.id}/set?type=TOTE-64`,
      `/terms/${partner.id}/settings`,
      '/months',
      `/months/${month}`,
    ];
  },
  'sif@fennmark.example': async (camera) => {
    const part = await firstOf(camera, '/parts');
    return [
      '/',
      '/container-types',
      '/container-types/new',
      '/container-types/TOTE-64',
      '/parts',
      '/parts/new',
      `/parts/${part.id}`,
      '/parts/loops/TOTE-64',
      '/pool',
      '/pool/TOTE-64',
      '/pool/TOTE-64/approve',
    ];
  },
  'jonas@fennmark.example': async (camera) => {
    const partner = await firstOf(camera, '/partners');
    const person = await firstOf(camera, '/people');
    const letter = await firstOf(camera, '/letters');
    return [
      '/',
      '/partners',
      '/partners/new',
      `/partners/${partner.id}`,
      '/people',
      '/people/invite',
      `/people/${person.id}`,
      '/mail',
      `/mail/${letter.id}`,
      '/log',
    ];
  },
};
