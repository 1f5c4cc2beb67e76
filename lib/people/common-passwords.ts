/**
 * Words that passwords of twelve and more characters are most often made of (common practice, from memory). Anything
 * from the usual lists that is shorter than twelve characters is refused by its length already; these are the ones that
 * reach it with figures and signs around them.
 */
const WORDS =
  'password passwort motdepasse contrasena senha wachtwoord passwordpassword letmein welcome willkommen bienvenue iloveyou ' +
  'iloveyouforever qwerty qwertyuiop qwertyuiopasdfghjkl asdfghjkl asdfghjklzxcvbnm qwertz azerty azertyuiop zxcvbnm ' +
  'administrator admin adminadmin superuser superman batman spiderman pokemon dragon monkey football baseball basketball ' +
  'liverpool arsenal chelsea manchester barcelona realmadrid princess sunshine sunflower butterfly chocolate computer ' +
  'internet starwars michael jennifer jessica charlie daniel thomas ashley matthew anthony elizabeth alexander christopher ' +
  'whatever trustno trustnoone freedom mustang corvette ferrari mercedes yamaha harleydavidson cheese summer winter spring ' +
  'autumn monday january february march april june july august september october november december changeme changethis ' +
  'default secret secretsecret topsecret login loginlogin access accessaccess master mastermaster hello helloworld test ' +
  'testtest testing testtesttest guest guestguest user useruser root rootroot company office service support temporary ' +
  'temppassword newpassword mypassword yourpassword correcthorsebatterystaple abcdefghijkl abcdefghijklm ' +
  'waterworks watertreatment drinkingwater water waterwater operator operatoroperator chlorine marlwick marlwickmarlwick';

export const COMMON_PASSWORDS: ReadonlySet<string> = new Set(WORDS.split(' '));
