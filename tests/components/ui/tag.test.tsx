import { render, screen } from '@testing-library/react';
import type { Tone } from '@/components/theme/meaning';
import { Tag } from '@/components/ui/Tag';

const tones: Tone[] = ['open', 'moving', 'done', 'differs', 'disputed'];

/** The drawing without its colours. */
const shapeOf = (tone: Tone) => {
  const { container, unmount } = render(<Tag tone={tone} label="state" />);
  const hole = container.querySelectorAll('svg')[1]?.innerHTML.replace(/var\(--[a-z-]+\)/g, '');
  unmount();
  return hole;
};

test('a tag says its state in words', () => {
  render(<Tag tone="differs" label="8 fewer than declared" />);
  expect(screen.getByText('8 fewer than declared')).toBeInTheDocument();
});

test('without colour each state still has a hole of its own shape', () => {
  expect(new Set(tones.map(shapeOf)).size).toBe(tones.length);
});
