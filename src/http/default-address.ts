/** Where the service listens unless HOST and PORT say otherwise: to this machine alone, until someone decides more. */
export const defaultAddress = { host: '127.0.0.1', port: 3000 } as const;
