import { build } from "./ground/build.mjs";
import { main, say } from "./ground/say.mjs";

/** `npm run build`: the production build, unless it is that of the sources as they are. */
await main(async () => {
  await build();
  say("The production build is current.");
});
