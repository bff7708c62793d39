/** Passwords of twelve characters and more that are tried first by everybody; compared without case and marks. */
export const COMMON_PASSWORDS: ReadonlySet<string> = new Set(
  `123456789012 1234567890123 123456789123 1234567891234 12345678910 0123456789012 098765432109 987654321012
  111111111111 000000000000 999999999999 121212121212 123123123123 112233445566 123321123321 102030405060
  qwertyuiop12 qwertyuiop123 qwertyuiopasdf qwertyqwerty qwerty123456 qwerty1234567 qwertyuiopas 1q2w3e4r5t6y
  1q2w3e4r5t6y7u 1qaz2wsx3edc 1qaz2wsx3edc4rfv qazwsxedcrfv zaq12wsxcde3 asdfghjkl123 asdfasdfasdf zxcvbnm12345
  abcdefghijkl abcdefghijklm abcdef123456 abc123abc123 abcd12345678 abcdabcdabcd aaaaaaaaaaaa
  password1234 password12345 password123456 passwordpassword mypassword12 mypassword123 thisismypassword
  changeme1234 changemechangeme changemenow1 letmeinletmein letmein12345 letmein123456 welcome12345 welcome123456
  welcomewelcome administrator administrator1 admin1234567 admin12345678 adminadmin12 adminadminadmin admin123admin
  iloveyou1234 iloveyou12345 iloveyouforever sunshine1234 football1234 baseball1234 dragon123456 monkey123456
  superman1234 princess1234 trustno1trustno1 correcthorsebatterystaple secret123456 secretsecret default12345
  cotterpin1234 cotterpincotterpin hovercraft123 hovercraft1234 stockroom123 stockroom1234 workshop1234`.split(
    /\s+/,
  ),
);
