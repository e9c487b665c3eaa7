import type { TermsVersion } from '@/shared/contracts/terms';
import { addDays, lastDayOfMonth } from '@/shared/domain/calendar';
import type { PartnerTermsPage } from './PartnerTermsScreen';

/** What the form begins with: the type's newest terms, else what the container type says, else nothing. */
export function startingTerms(page: PartnerTermsPage, typeCode: string | undefined): Partial<TermsVersion> {
  const validFrom = page.closedThrough ? addDays(lastDayOfMonth(page.closedThrough), 1) : '';
  const known = page.types.find((each) => each.type.code === typeCode);
  const [newest] = known?.versions ?? [];
  if (newest) {
    const { id: _id, standing: _standing, setBy: _by, setAt: _at, ...version } = newest;
    return { ...version, validFrom: '' };
  }
  const fresh = page.otherTypes.find((each) => each.code === typeCode);
  return {
    typeCode: typeCode ?? '',
    validFrom: fresh?.needed ? '' : validFrom,
    deposit: '',
    replacement: fresh?.replacement ?? '',
    dailyFee: '',
    damageFee: '',
    cleaningFee: '',
    residualFloorPct: '',
    lostAfterDays: null,
    ...(fresh ? { usefulLifeMonths: fresh.usefulLifeMonths } : {}),
  };
}
