/** What an airflow result can say besides its numbers. The engine writes no sentences. */

export const AIRFLOW_METHODS = [
  'measured',
  'temperature-rise-electric',
  'temperature-rise-gas',
  'static-pressure',
] as const;
export type AirflowMethod = (typeof AIRFLOW_METHODS)[number];

/** Why there is no airflow. `inputs` are the ids of what is missing. */
export type AirflowReason =
  | { readonly code: 'inputs-missing'; readonly inputs: readonly string[] }
  | {
      readonly code:
        'other-blower-speed' | 'no-temperature-rise' | 'dash' | 'outside-table' | 'table-not-usable' | 'outside-range';
    };

export type AirflowCaution =
  /** Nobody said whether the blower ran at the speed it has in cooling: the airflow proves nothing about cooling until it is known. */
  | 'blower-speed-unknown'
  /** Sea level was taken. */
  | 'elevation-assumed'
  /** No humidity was given: 0 to 0.012 was allowed for. */
  | 'humidity-assumed'
  /** AFUE stands in for the steady-state efficiency. */
  | 'afue-for-steady-state'
  /** The supply side is not above the room: hoses or tips exchanged. */
  | 'supply-static-not-above-room'
  /** The entered table has an airflow that rises with the static pressure. */
  | 'fan-table-rises';
