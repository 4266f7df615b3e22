/** What the lines are computed from and what they come to, a column each; a line is a slot. Sized in powers of two. */
export class LineColumns {
  private capacity = 64
  /** Where the row of the line's room begins; 0 for the house, whose formulas read no room. */
  row = new Int32Array(this.capacity)
  /** 100 + the waste percentage. */
  wasteHundred = new Float64Array(this.capacity)
  /** 0: sold loose, or hired work, which isn't packaged. */
  packageSize = new Float64Array(this.capacity)
  lowE4 = new Float64Array(this.capacity)
  likelyE4 = new Float64Array(this.capacity)
  highE4 = new Float64Array(this.capacity)
  /** 0 for own hands. */
  minimumCents = new Float64Array(this.capacity)
  isHired = new Uint8Array(this.capacity)
  /** 0 for hired work. */
  hoursPerUnit = new Float64Array(this.capacity)
  /** Numbers of the line's groups. */
  roomGroup = new Int32Array(this.capacity)
  systemGroup = new Int32Array(this.capacity)
  tradeGroup = new Int32Array(this.capacity)

  measured = new Float64Array(this.capacity)
  quantityHundredths = new Float64Array(this.capacity)
  lowCents = new Float64Array(this.capacity)
  likelyCents = new Float64Array(this.capacity)
  highCents = new Float64Array(this.capacity)
  hoursHundredths = new Float64Array(this.capacity)

  /** Makes room for a slot. */
  fit(slot: number): void {
    if (slot < this.capacity) return
    while (slot >= this.capacity) this.capacity *= 2
    this.row = grown(this.row, this.capacity)
    this.wasteHundred = grown(this.wasteHundred, this.capacity)
    this.packageSize = grown(this.packageSize, this.capacity)
    this.lowE4 = grown(this.lowE4, this.capacity)
    this.likelyE4 = grown(this.likelyE4, this.capacity)
    this.highE4 = grown(this.highE4, this.capacity)
    this.minimumCents = grown(this.minimumCents, this.capacity)
    this.isHired = grown(this.isHired, this.capacity)
    this.hoursPerUnit = grown(this.hoursPerUnit, this.capacity)
    this.roomGroup = grown(this.roomGroup, this.capacity)
    this.systemGroup = grown(this.systemGroup, this.capacity)
    this.tradeGroup = grown(this.tradeGroup, this.capacity)
    this.measured = grown(this.measured, this.capacity)
    this.quantityHundredths = grown(this.quantityHundredths, this.capacity)
    this.lowCents = grown(this.lowCents, this.capacity)
    this.likelyCents = grown(this.likelyCents, this.capacity)
    this.highCents = grown(this.highCents, this.capacity)
    this.hoursHundredths = grown(this.hoursHundredths, this.capacity)
  }
}

function grown<T extends Int32Array | Float64Array | Uint8Array>(column: T, capacity: number): T {
  const larger = new (column.constructor as new (length: number) => T)(capacity)
  larger.set(column)
  return larger
}
