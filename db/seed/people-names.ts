/** Invented people of many places: given and family names in the order each is said. */
const POOLS: readonly { given: readonly string[]; family: readonly string[]; familyFirst?: boolean }[] = [
  {
    given: ['Oskar', 'Freja', 'Åsa', 'Sindre', 'Birgitta'],
    family: ['Lindqvist', 'Øverland', 'Söderbäck', 'Hjelmström'],
  },
  {
    given: ['Zofia', 'Bartłomiej', 'Łucja', 'Przemysław'],
    family: ['Wójcik', 'Szczęsny', 'Grzybowska', 'Żak'],
  },
  {
    given: ['Inês', 'Tiago', 'Conceição', 'João Pedro'],
    family: ['Teixeira de Sá', 'Guimarães', 'Falcão', 'Brandão'],
  },
  { given: ['Wanjiru', 'Otieno', 'Achieng', 'Kamau'], family: ['Mwangi', 'Odhiambo', 'Njoroge', 'Wekesa'] },
  {
    given: ['Adaeze', 'Chukwuemeka', 'Folasade', 'Olumide'],
    family: ['Okonkwo', 'Adeyẹmi', 'Balogun', 'Eze'],
  },
  {
    given: ['Siobhán', 'Cillian', 'Aoife', 'Pádraig'],
    family: ["O'Flaherty", 'Mac Giolla Bhríde', 'Ní Dhomhnaill', 'Byrne'],
  },
  {
    given: ['Priya', 'Arjun', 'Meenakshi', 'Venkataraman'],
    family: ['Raghunathan', 'Iyer', 'Deshpande', 'Chatterjee'],
  },
  { given: ['अनन्या', 'विक्रम'], family: ['शर्मा', 'जोशी'] },
  { given: ['Nguyễn Thị', 'Trần Văn', 'Lê Minh'], family: ['Hương', 'Đức', 'Quỳnh'] },
  { given: ['明莉', '健太', '雅子'], family: ['山口', '小野寺', '長谷川'], familyFirst: true },
  { given: ['지우', '민준', '서연'], family: ['김', '박', '남궁'], familyFirst: true },
  { given: ['美玲', '志強', '曉雯'], family: ['陳', '歐陽', '林'], familyFirst: true },
  { given: ['Ольга', 'Дмитро', 'Наталія'], family: ['Шевчук', 'Коваленко', 'Бондар'] },
  { given: ['Ελένη', 'Κωνσταντίνος'], family: ['Παπαδάκη', 'Βασιλείου'] },
  { given: ['ليلى', 'يوسف', 'مريم'], family: ['الخطيب', 'حداد', 'منصور'] },
  { given: ['נועה', 'איתן'], family: ['לוי', 'ברק'] },
  { given: ['Noor', 'Yusuf', 'Layla', 'Tariq'], family: ['Haddad', 'al-Khatib', 'Mansour', 'Benali'] },
  { given: ['Ayşe', 'Mehmet', 'Gülşah'], family: ['Yıldırım', 'Öztürk', 'Çelik'] },
  { given: ['Marama', 'Wiremu', 'Aroha'], family: ['Tūhoe-Rangi', 'Parata', 'Ngata'] },
  {
    given: ['Itzel', 'Joaquín', 'María de los Ángeles'],
    family: ['Quispe Mamani', 'Peña', 'Ibáñez y Larrañaga'],
  },
  { given: ['Lou', 'Jo', 'Bo', 'Ed'], family: ['Li', 'Ng', 'Ek', 'Ash'] },
  {
    given: ['Margaret', 'Wilfred', 'Constance', 'Hubert'],
    family: ['Featherstonehaugh', 'Pike', 'Vandermeulen-Castellanos', 'Tew'],
  },
  {
    given: ['Anneke', 'Jürgen', 'Käthe', 'Matthäus'],
    family: ['van der Berg', 'Größmann', 'Müllerschön', 'Weiß'],
  },
  { given: ['Réka', 'Zoltán', 'Lőrinc'], family: ['Szőke', 'Király', 'Fehérvári'] },
];

/** Every full name the pools make, culture after culture, so that neighbours in the list differ. */
export function demoNames(count: number): string[] {
  const made = POOLS.map(({ given, family, familyFirst }) =>
    given.flatMap((first, at) =>
      family.map((_, shift) => {
        const last = family[(at + shift) % family.length] ?? '';
        return familyFirst ? `${last}${first}` : `${first} ${last}`;
      }),
    ),
  );
  const names: string[] = [];
  for (let row = 0; names.length < count; row += 1) {
    const before = names.length;
    for (const pool of made) {
      const name = pool[row];
      if (name !== undefined && names.length < count) names.push(name);
    }
    if (names.length === before) throw new Error(`Only ${before} names`);
  }
  return names;
}
