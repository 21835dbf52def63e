export interface UsState {
  code: string
  name: string
  /** Living animals are handed over and shipped here. Alaska, Hawaii and the territories are off for now. */
  takesAnimals: boolean
}

const contiguous =
  'AL Alabama,AZ Arizona,AR Arkansas,CA California,CO Colorado,CT Connecticut,DE Delaware,DC District of Columbia,FL Florida,GA Georgia,ID Idaho,IL Illinois,IN Indiana,IA Iowa,KS Kansas,KY Kentucky,LA Louisiana,ME Maine,MD Maryland,MA Massachusetts,MI Michigan,MN Minnesota,MS Mississippi,MO Missouri,MT Montana,NE Nebraska,NV Nevada,NH New Hampshire,NJ New Jersey,NM New Mexico,NY New York,NC North Carolina,ND North Dakota,OH Ohio,OK Oklahoma,OR Oregon,PA Pennsylvania,RI Rhode Island,SC South Carolina,SD South Dakota,TN Tennessee,TX Texas,UT Utah,VT Vermont,VA Virginia,WA Washington,WV West Virginia,WI Wisconsin,WY Wyoming'
const apart =
  'AK Alaska,HI Hawaii,AS American Samoa,GU Guam,MP Northern Mariana Islands,PR Puerto Rico,VI US Virgin Islands,FM Micronesia,MH Marshall Islands,PW Palau'

const parse = (list: string, takesAnimals: boolean) =>
  list.split(',').map((row): UsState => ({ code: row.slice(0, 2), name: row.slice(3), takesAnimals }))

export const stateFacts: readonly UsState[] = [...parse(contiguous, true), ...parse(apart, false)]
