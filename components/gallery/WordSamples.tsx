import { text } from '@/shared/text/catalogue';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { ButtonLink, Link } from '../ui/Link';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';

const variants = ['head', 'title', 'subhead', 'large', 'body', 'soft', 'small', 'label'] as const;

export function WordSamples() {
  return (
    <>
      <Card title={text.gallery.words}>
        {variants.map((variant) => (
          <Text key={variant} variant={variant} {...(variant === 'head' ? { level: 3 as const } : {})}>
            Tarnby Assembly sends 400 totes 600×400×280
          </Text>
        ))}
        <Box row wrap gap="xl" align="baseline">
          <Figure units={708} size="hero" />
          <Figure units={6420} size="figure" />
          <Figure units={141} size="head" tone="differs" />
          <Figure money="412.60" currency="EUR" size="figure" />
          <Figure money="-20432" currency="EUR" plain />
          <Figure number={3.2} unit="days" />
          <Figure share={0.984} />
          <Figure units={null} />
        </Box>
      </Card>
      <Card title={text.gallery.actions}>
        <Box row wrap>
          <Button label="Send empties" onPress={() => undefined} />
          <Button label="As declared" kind="secondary" onPress={() => undefined} />
          <Button label="as declared" kind="quiet" onPress={() => undefined} />
          <Button label="Send count" busy onPress={() => undefined} />
          <Button label="Send count" disabled onPress={() => undefined} />
          <ButtonLink label="Open dispute" href="/gallery" kind="secondary" />
          <Link label="all 9" href="/gallery" />
        </Box>
      </Card>
      <Card title={text.gallery.tags}>
        <Box row wrap>
          <Tag tone="open" label="arrived unannounced, 24 totes" />
          <Tag tone="moving" label="on the way" />
          <Tag tone="done" label="as declared" />
          <Tag tone="differs" label="8 fewer than declared" />
          <Tag tone="disputed" label="partly disputed" />
        </Box>
      </Card>
    </>
  );
}
