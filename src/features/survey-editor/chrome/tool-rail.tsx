import { Fence, Hand, MousePointer2, RectangleHorizontal, Square, TrendingDown } from 'lucide-react'
import type { ComponentType } from 'react'
import { classes } from '@/components/classes'
import type { Editor } from '../model/editor'
import { type ToolName, toolLabels, toolNames } from '../tools/tool-names'

const icons: Record<ToolName, ComponentType<{ className?: string; 'aria-hidden': true }>> = {
  select: MousePointer2,
  post: PostIcon,
  bay: Fence,
  stair: TrendingDown,
  rectangle: RectangleHorizontal,
  pan: Hand,
}

/** A post on its foot. */
function PostIcon({ className }: { className?: string }) {
  return (
    <svg
      aria-hidden="true"
      viewBox="0 0 24 24"
      className={className}
      stroke="currentColor"
      strokeWidth="2"
      fill="none"
    >
      <path d="M12 3v18M7 21h10" strokeLinecap="round" />
    </svg>
  )
}

/** The tools: under the thumb on a phone, at the left on a desk. */
export function ToolRail({ editor, tool, canEdit }: { editor: Editor; tool: ToolName; canEdit: boolean }) {
  return (
    <div
      role="toolbar"
      aria-label="Tools"
      className="flex border-t border-rule bg-card pb-[env(safe-area-inset-bottom)] md:flex-col md:border-t-0 md:border-r md:pb-0"
    >
      {toolNames.map((name) => {
        const Icon = icons[name] ?? Square
        return (
          <button
            key={name}
            type="button"
            aria-pressed={tool === name}
            disabled={!canEdit && name !== 'select' && name !== 'pan'}
            onClick={() => editor.chooseTool(name)}
            className={classes(
              'flex min-h-14 min-w-0 flex-1 flex-col items-center justify-center gap-0.5 px-1 text-xs md:min-h-16 md:w-20 md:flex-none',
              'disabled:opacity-40',
              tool === name ? 'bg-chalk-ground font-semibold text-chalk' : 'text-soft hover:text-ink',
            )}
          >
            <Icon aria-hidden className="size-6" />
            <span className="max-w-full truncate">{toolLabels[name]}</span>
          </button>
        )
      })}
    </div>
  )
}
