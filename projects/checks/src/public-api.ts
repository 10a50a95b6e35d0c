/** What the library gives to the elements and the console; a change here is on purpose. */
export {};
