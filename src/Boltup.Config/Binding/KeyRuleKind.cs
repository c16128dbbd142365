namespace Boltup.Config.Binding;

public enum KeyRuleKind
{
    ExactlyOne,
    AtLeastOne,
    AtMostOne,
    Needs,
}
