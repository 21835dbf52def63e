/** How a member wants quantities shown. Inside the product everything is metric, cents and UTC. */
export type UnitSystem = 'us' | 'metric'
