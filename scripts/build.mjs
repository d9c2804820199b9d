import { build } from "./ground/build.mjs";
import { dataFolder } from "./ground/place.mjs";
import { main, say } from "./ground/say.mjs";
import { secretsIn } from "./ground/secrets.mjs";

/** `npm run build`: the production build, unless it is that of the sources as they are. */
await main(async () => {
  await build(secretsIn(dataFolder()).action);
  say("The production build is current.");
});
