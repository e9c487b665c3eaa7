import { StyleSheet, View } from 'react-native';
import { text } from '@/shared/text/catalogue';
import { radius, space } from '../theme/measures';
import { meaning } from '../theme/meaning';
import { Box } from '../ui/Box';
import { Figure } from '../ui/Figure';
import { RowLink } from '../ui/Link';
import { Text } from '../ui/Text';
import type { Place } from './places';

type Props = {
  place: Pick<Place, 'href' | 'label' | 'tone'>;
  current: boolean;
  waiting?: number | undefined;
};

const nameOf = (label: string, waiting: number | undefined) =>
  waiting ? `${label}, ${text.shell.waiting(waiting)}` : label;

/** A place in the rail, with the number of what waits there. */
export function RailLink({ place, current, waiting }: Props) {
  return (
    <View style={[styles.rail, current && styles.railCurrent]}>
      <RowLink href={place.href} name={nameOf(place.label, waiting)} current={current}>
        <Box row spread="between">
          <Text {...(current ? { tone: 'action' as const, strong: true } : {})}>{place.label}</Text>
          {waiting ? <Figure units={waiting} {...(place.tone ? { tone: place.tone } : {})} /> : null}
        </Box>
      </RowLink>
    </View>
  );
}

/** A place in the bottom bar. */
export function BarLink({ place, current, waiting }: Props) {
  return (
    <View style={styles.bar}>
      <View style={[styles.marker, current && styles.markerCurrent]} />
      <RowLink href={place.href} name={nameOf(place.label, waiting)} current={current}>
        <Box row gap="xs" spread="center">
          <Text variant="small" oneLine {...(current ? { tone: 'action' as const, strong: true } : {})}>
            {place.label}
          </Text>
          {waiting ? (
            <Figure units={waiting} size="small" {...(place.tone ? { tone: place.tone } : {})} />
          ) : null}
        </Box>
      </RowLink>
    </View>
  );
}

const styles = StyleSheet.create({
  rail: { borderRadius: radius, paddingHorizontal: space.m, marginHorizontal: 0 },
  railCurrent: { backgroundColor: meaning.actionWash },
  bar: { flexGrow: 1, flexShrink: 1, minHeight: 56, minWidth: 44, justifyContent: 'center' },
  marker: { position: 'absolute', top: -1, left: 8, right: 8, height: 4 },
  markerCurrent: { backgroundColor: meaning.action },
});
