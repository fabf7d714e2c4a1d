import { joinBayTool } from './join-bay/join-bay-tool'
import { markRectangleTool } from './mark-rectangle/mark-rectangle-tool'
import { markStairTool } from './mark-stair/mark-stair-tool'
import { panTool } from './pan/pan-tool'
import { putPostTool } from './put-post/put-post-tool'
import { selectTool } from './select/select-tool'
import type { ToolHost, ToolMachine } from './tool'
import type { ToolName } from './tool-names'

/** Every tool, by name. */
export const makeTools = (host: ToolHost): Record<ToolName, ToolMachine> => ({
  select: selectTool(host),
  post: putPostTool(host),
  bay: joinBayTool(host),
  stair: markStairTool(host),
  rectangle: markRectangleTool(host),
  pan: panTool(host),
})
