/** Name and version of the service, as in package.json: a test holds the two together. */
export const serviceName = 'field-length-service';
export const serviceVersion = '0.1.0';
