// npm run build: the same cached builds that npm start serves; prints where they are.
import { buildServer, buildWeb } from './setup/builds.mjs';
import { main } from './setup/main.mjs';
import { installPackages } from './setup/packages.mjs';

async function build() {
  await installPackages();
  console.log(await buildWeb());
  console.log(await buildServer());
  return 0;
}

await main(build, () => 130);
