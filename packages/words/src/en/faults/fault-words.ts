/** Words of a fault: its name, one sentence for the customer, and what it is for the technician. */
export interface FaultWords {
  readonly name: string;
  readonly plain: string;
  readonly what: string;
  /** Said beside the repair. */
  readonly caution?: string;
}
