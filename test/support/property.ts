// The one place where the property tests take fast-check from. It is kept for its shrinking of what fails. The suite is the
// same for everyone: a fixed seed, unless SEED names another (SEED=random draws one; a campaign runs over many).
import fc from "fast-check";

const wanted = process.env.SEED;
if (wanted !== "random") fc.configureGlobal({ seed: wanted === undefined ? 20261201 : Number(wanted) });

export default fc;
