/** Name and version that answers carry. */
export const engineVersion = 'kentledge/0.1.0'
