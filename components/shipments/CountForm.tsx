import { useState } from 'react';
import { useWatch } from 'react-hook-form';
import { countShipment, listShipmentChoices, type ShipmentDetail } from '@/shared/contracts/shipments';
import type { AnswerOf } from '@/shared/contracts/operation';
import { text } from '@/shared/text/catalogue';
import { isPassing, ProblemError } from '../data/problem-error';
import { usePost, useRead } from '../data/use-operation';
import { FormFrame } from '../forms/FormFrame';
import { SentFilesField } from '../forms/SentFilesField';
import { TextAreaField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { Box } from '../ui/Box';
import { Text } from '../ui/Text';
import { AddType } from './AddType';
import { CountedAlready } from './CountedAlready';
import { type CountDraft, countDraft, emptyCount, isCounted, type TypedLine } from './count-draft';
import { CountLine, type LineToCount } from './CountLine';

const words = text.shipments;

export type SentCount = AnswerOf<typeof countShipment>;
type Props = { shipment: ShipmentDetail; onSent: (count: SentCount) => void };

/** Counting one shipment. What is typed survives an error, a reload, a lost network and a new sign-in. */
export function CountForm({ shipment, onSent }: Props) {
  const draft = useDraftForm({
    schema: countDraft,
    name: `count ${shipment.id}`,
    defaultValues: emptyCount(shipment),
  });
  const { send, unsent, counted } = useSendCount(shipment.id, onSent);
  const [photosUnsent, setPhotosUnsent] = useState(false);
  const lines = (useWatch({ control: draft.form.control, name: 'lines' }) ?? []) as TypedLine[];
  const left = lines.filter((line) => !isCounted(line)).length;
  return (
    <FormFrame
      draft={draft}
      label={words.countHead(shipment.reference)}
      onSubmit={send}
      submitLabel={unsent ? words.sendAgain : words.sendCount}
      inBar
      disabled={left > 0 || photosUnsent}
      note={<BarNote left={left} of={lines.length} unsent={unsent} />}
    >
      {counted ? <CountedAlready {...counted} shipment={shipment} /> : null}
      <Lines draft={draft} lines={lines} shipment={shipment} />
      <SentFilesField
        name="photos"
        label={words.photos}
        hideLabel
        hint={words.photosHint}
        kind="photo"
        onUnsent={setPhotosUnsent}
      />
      <TextAreaField name="note" label={words.countNote} optional />
    </FormFrame>
  );
}

/** Sends under the key kept with the draft, so that a try that may have arrived has one effect. */
function useSendCount(shipmentId: string, onSent: Props['onSent']) {
  const post = usePost(countShipment, { refreshes: ['balances', 'today', 'differences'] });
  const [unsent, setUnsent] = useState(false);
  const [counted, setCounted] = useState<{ by: string | null; at: string } | undefined>();
  const send = async ({ lines, note, photos, key }: CountDraft) => {
    setUnsent(false);
    try {
      const body = { lines, note, photoIds: photos.map((photo) => photo.id) };
      onSent(await post.mutateAsync({ params: { shipment: shipmentId }, body, key }));
    } catch (error) {
      setUnsent(isPassing(error));
      if (error instanceof ProblemError && error.code === 'already counted')
        setCounted(error.data as { by: string | null; at: string });
      throw error;
    }
  };
  return { send, unsent, counted };
}

type LinesProps = {
  draft: ReturnType<typeof useDraftForm<typeof countDraft>>;
  lines: readonly TypedLine[];
  shipment: ShipmentDetail;
};

function Lines({ draft, lines, shipment }: LinesProps) {
  const types = useRead(listShipmentChoices).data?.types ?? [];
  const setLines = (next: readonly TypedLine[]) =>
    draft.form.setValue('lines', [...next] as never, { shouldDirty: true });
  const lineOf = (typeCode: string): LineToCount => {
    const declared = shipment.lines.find((line) => line.typeCode === typeCode);
    if (declared) return declared;
    const type = types.find((each) => each.code === typeCode);
    return { typeName: type?.name ?? typeCode, unitsPerStack: type?.unitsPerStack ?? 1, declared: 0 };
  };
  return (
    <Box gap="m">
      {lines.map((typed, at) => (
        <CountLine
          key={typed.typeCode}
          at={at}
          line={lineOf(typed.typeCode)}
          onTakeOff={() => setLines(lines.filter((each) => each !== typed))}
        />
      ))}
      <AddType
        types={types.filter((type) => !lines.some((line) => line.typeCode === type.code))}
        onAdd={(typeCode) => setLines([...lines, { typeCode, counted: null, damaged: 0, dirty: 0 }])}
      />
    </Box>
  );
}

function BarNote({ left, of, unsent }: { left: number; of: number; unsent: boolean }) {
  if (unsent)
    return (
      <Text tone="differs" role="alert">
        {words.notSent}
      </Text>
    );
  return <Text role="status">{left === 0 ? words.allCounted : words.linesLeft(left, of)}</Text>;
}
