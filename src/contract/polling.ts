/** Long synchronous work asks this now and then and gives up when it says true. */
export interface Polling {
  readonly stopped?: () => boolean;
}
