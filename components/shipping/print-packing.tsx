import { saveFile } from '@/components/trips/save-file'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { usePackingSheet } from '@/hooks/use-shipping-acts'

/** The packing sheet and a label for each box, to print. */
export function PrintPacking({ orderId }: { orderId: string }) {
  const print = usePackingSheet(orderId)
  return (
    <>
      <Button
        label="Packing sheet and labels (PDF)"
        kind="secondary"
        icon="print"
        isWide
        isBusy={print.isPending}
        busyLabel="Making the sheet"
        onPress={() =>
          print.mutate(undefined, {
            onSuccess: (bytes) =>
              saveFile(bytes, { name: 'packing-and-labels.pdf', type: 'application/pdf' }),
          })
        }
      />
      {print.error ? (
        <Banner tone="danger" title="The sheet was not made" isLive>
          {print.error.message}
        </Banner>
      ) : null}
    </>
  )
}
