/** The tools, in the order they stand on the rail. */
export const toolNames = ['select', 'post', 'bay', 'stair', 'rectangle', 'pan'] as const
export type ToolName = (typeof toolNames)[number]

/** What the rail calls them. */
export const toolLabels: Record<ToolName, string> = {
  select: 'Select',
  post: 'Post',
  bay: 'Bay',
  stair: 'Stair',
  rectangle: 'Rectangle',
  pan: 'Pan',
}
