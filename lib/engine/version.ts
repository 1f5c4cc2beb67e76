/** Changes whenever any result could change other than through the constants (those have their own hash). */
export const ENGINE_VERSION = '1.1.0';
