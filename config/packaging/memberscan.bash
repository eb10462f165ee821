# Completion of memberscan for bash; printed by 'memberscan manual bash'.
_memberscan() {
  local word=${COMP_WORDS[COMP_CWORD]} words=
  if [ "$COMP_CWORD" -eq 1 ]; then
    words='screen members section frame compare restore sheet settings enqueue work manual --help --version'
  else
    case ${COMP_WORDS[1]} in
      screen) words='--forces --forces-beside --settings --kind --out --timestamp --decisions --decided-on --bcf --bcf-version --request --xlsx --parquet --earlier --pdf --set-template --workers --resume --verbose --help' ;;
      members) words='--forces --settings --csv --json --forces-only --write-forces-template --results --verbose --help' ;;
      section) words='--forces --at --shear --poisson --yield --svg --smallest --json --help' ;;
      frame) words='--json --help' ;;
      compare) words='--forces --earlier-forces --later-forces --settings --csv --json --html --help' ;;
      restore) words='--out --help' ;;
      sheet) words='--forces --settings --html --verbose --help' ;;
      settings) words='--explain --settings --write --help' ;;
      enqueue) words='--queue --root --forces --forces-beside --settings --kind --timestamp --set-template --also --help' ;;
      work) words='--queue --root --results --until-empty --ack-wait --verbose --help' ;;
      manual) words='man bash fish --help' ;;
    esac
  fi
  COMPREPLY=($(compgen -W "$words" -- "$word"))
  if [ ${#COMPREPLY[@]} -eq 0 ]; then COMPREPLY=($(compgen -f -- "$word")); fi
}
complete -o filenames -F _memberscan memberscan
