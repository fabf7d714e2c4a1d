import { Ruler, Undo2 } from 'lucide-react'
import { useState } from 'react'
import { Button, IconButton } from '@/components/button'
import { Menu, MenuItem, MenuLabel } from '@/components/menu'
import { Card } from '@/components/page'
import { Sheet } from '@/components/sheet'
import { sayDone, sayProblem } from '@/components/toast'
import { Tooltip } from '@/components/tooltip'

export function ActionParts() {
  const [open, setOpen] = useState<'side' | 'middle'>()
  const close = () => setOpen(undefined)
  return (
    <Card title="Actions">
      <div className="flex flex-wrap gap-2">
        <Button look="primary">Save the reading</Button>
        <Button>Cancel</Button>
        <Button look="quiet">Show more</Button>
        <Button look="danger">Strike the reading</Button>
        <Button look="primary" busy>
          Saving
        </Button>
        <Button disabled>Not yet</Button>
        <IconButton label="Undo">
          <Undo2 aria-hidden="true" />
        </IconButton>
        <IconButton label="Put post" pressed>
          <Ruler aria-hidden="true" />
        </IconButton>
      </div>
      <div className="mt-4 flex flex-wrap gap-2">
        <Button onClick={() => setOpen('side')}>Open a sheet</Button>
        <Button onClick={() => setOpen('middle')}>Ask a question</Button>
        <Menu trigger={<Button>Open a menu</Button>}>
          <MenuLabel>Move the job to</MenuLabel>
          <MenuItem onSelect={() => sayDone('Moved to price.')}>price</MenuItem>
          <MenuItem onSelect={close} disabled>
            agreed
          </MenuItem>
        </Menu>
        <Button onClick={() => sayDone('Post P3 is removed.', () => sayDone('Post P3 is back.'))}>
          Say done
        </Button>
        <Button onClick={() => sayProblem('The photo was not sent. It is kept here; try again with signal.')}>
          Say a problem
        </Button>
        <Tooltip text="Readings are struck, never erased.">
          <Button look="quiet">A word more</Button>
        </Tooltip>
      </div>
      <Sheet
        open={open !== undefined}
        onOpenChange={close}
        title="Post P3"
        description="A corner post."
        place={open ?? 'side'}
      >
        <Button look="primary" className="w-full" onClick={close}>
          Done
        </Button>
      </Sheet>
    </Card>
  )
}
