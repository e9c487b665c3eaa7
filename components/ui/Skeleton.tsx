import { text } from '@/shared/text/catalogue';

/** Grey rules where lines will stand, so that the page keeps its shape while it loads. */
export function Skeleton({ lines = 3, tall }: { lines?: number; tall?: boolean }) {
  return (
    <div
      role="status"
      aria-label={text.ui.loading}
      style={{ display: 'flex', flexDirection: 'column', gap: 14, padding: '8px 0' }}
    >
      {Array.from({ length: lines }, (_, at) => (
        <div
          key={at}
          className="tk-skeleton"
          style={{ height: tall ? 44 : 14, width: `${[92, 78, 86, 64, 81][at % 5]}%` }}
        />
      ))}
    </div>
  );
}
