import { usePathname } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { text } from '@/shared/text/catalogue';
import { useSignedIn } from '../data/use-session';
import { space } from '../theme/measures';
import { useIsWide } from '../theme/use-breakpoint';
import { BottomBar, Main, Rail, SkipLink } from '../ui/Landmarks';
import { Brand } from './Brand';
import { BarLink, RailLink } from './PlaceLink';
import { footPlacesOf, isAt, placesOf, type Place } from './places';

/** Places at the left from 900 px, at the bottom below. */
export function Shell({ children }: { children: ReactNode }) {
  const wide = useIsWide();
  const path = usePathname();
  const { person, company, may, waiting } = useSignedIn();
  const who = { roles: person.roles, kind: company.kind, may };
  const places = placesOf(who);
  if (wide) {
    return (
      <View style={styles.wide}>
        <SkipLink />
        <Rail>
          <RailPlaces
            places={places}
            foot={footPlacesOf(who)}
            path={path}
            waiting={waiting}
            account={person.name}
          />
        </Rail>
        <Main>{children}</Main>
      </View>
    );
  }
  return (
    <View style={styles.narrow}>
      <SkipLink />
      <Main>{children}</Main>
      <BottomBar>
        <BarPlaces places={places} path={path} waiting={waiting} />
      </BottomBar>
    </View>
  );
}

type Waiting = Record<string, number>;
type RailProps = { places: Place[]; foot: Place[]; path: string; waiting: Waiting; account: string };

function RailPlaces({ places, foot, path, waiting, account }: RailProps) {
  return (
    <View style={styles.rail}>
      <Brand />
      <View style={styles.places}>
        {places.map((place) => (
          <RailLink
            key={place.key}
            place={place}
            current={isAt(place.href, path)}
            waiting={waiting[place.key]}
          />
        ))}
      </View>
      {foot.map((place) => (
        <RailLink key={place.key} place={place} current={isAt(place.href, path)} />
      ))}
      <RailLink place={{ href: '/account', label: account }} current={isAt('/account', path)} />
    </View>
  );
}

const inBar = 4;

/** The first four places and More, which also stands for every place that has no room. */
function BarPlaces({ places, path, waiting }: { places: Place[]; path: string; waiting: Waiting }) {
  const first = places.slice(0, inBar);
  const rest = places.slice(inBar).reduce((sum, place) => sum + (waiting[place.key] ?? 0), 0);
  const atFirst = first.some((place) => isAt(place.href, path));
  return (
    <View style={styles.bar}>
      {first.map((place) => (
        <BarLink
          key={place.key}
          place={place}
          current={isAt(place.href, path)}
          waiting={waiting[place.key]}
        />
      ))}
      <BarLink place={{ href: '/more', label: text.shell.place.more }} current={!atFirst} waiting={rest} />
    </View>
  );
}

const styles = StyleSheet.create({
  wide: { flexDirection: 'row', alignItems: 'stretch', flexGrow: 1 },
  narrow: { flexGrow: 1, paddingBottom: 72 },
  rail: { flexGrow: 1, padding: space.m, gap: space.xs },
  places: { flexGrow: 1, gap: 2, paddingTop: space.s },
  bar: { flexDirection: 'row' },
});
