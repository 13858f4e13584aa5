/** How long a session lasts: a working day; after that a person signs in again. */
export const sessionSeconds = 8 * 3600;
