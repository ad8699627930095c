/** Version of the calculations behind the figures. It goes up when any figure of an unchanged airframe may come out differently. */
export const ENGINE_VERSION = '2';
