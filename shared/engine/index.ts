/** The contents page of the engine: what the client, the server and the commands compute with. */
export type { EstimateInput, HouseInput, LineInput, RoomInput } from './estimateInput.ts'
