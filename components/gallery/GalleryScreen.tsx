import { text } from '@/shared/text/catalogue';
import { Page } from '../ui/Page';
import { BarSamples } from './BarSamples';
import { FieldSamples } from './FieldSamples';
import { StateSamples } from './StateSamples';
import { WordSamples } from './WordSamples';

/** Every primitive in its states. */
export function GalleryScreen() {
  return (
    <Page title={text.gallery.head} lead={text.gallery.lead}>
      <WordSamples />
      <BarSamples />
      <FieldSamples />
      <StateSamples />
    </Page>
  );
}
