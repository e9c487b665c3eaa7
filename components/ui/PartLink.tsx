import { formatUnits } from '@/shared/text/format';
import { Figure } from './Figure';
import { Link } from './Link';

type Props = { href: string; units: number; name: string };

/** A figure of a list that opens what it is made of. */
export function PartLink({ href, units, name }: Props) {
  if (units === 0) return <Figure units={0} plain tone="soft" />;
  return (
    <Link href={href} label={formatUnits(units)} name={`${formatUnits(units)}, ${name}`} strong={false} />
  );
}
