import { text } from '@/shared/text/catalogue';
import { useSignedIn } from '../data/use-session';
import { Card, Rule } from '../ui/Card';
import { Box } from '../ui/Box';
import { Page } from '../ui/Page';
import { RailLink } from './PlaceLink';
import { footPlacesOf, placesOf } from './places';

/** Every place, for screens with room for five. */
export function MoreScreen() {
  const { person, company, may, waiting } = useSignedIn();
  const who = { roles: person.roles, kind: company.kind, may };
  const places = [...placesOf(who).slice(4), ...footPlacesOf(who)];
  return (
    <Page title={text.shell.moreHead} narrow>
      <Card gap="xs">
        {places.map((place) => (
          <Box key={place.key} gap="xs">
            <RailLink place={place} current={false} waiting={waiting[place.key]} />
            <Rule />
          </Box>
        ))}
        <RailLink
          place={{ href: '/account', label: `${text.shell.place.account}: ${person.name}` }}
          current={false}
        />
      </Card>
    </Page>
  );
}
