/**
 */
package gapwright.model;

import java.util.Arrays;
import java.util.Collections;
import java.util.List;

import org.eclipse.emf.common.util.Enumerator;

/**
 * <!-- begin-user-doc -->
 * A representation of the literals of the enumeration '<em><b>Gap Place</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * What stands opposite the pole faces of a gap.
 * <!-- end-model-doc -->
 * @see gapwright.model.GapwrightPackage#getGapPlace()
 * @model
 * @generated
 */
public enum GapPlace implements Enumerator {
	/**
	 * The '<em><b>WITHIN LEG</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #WITHIN_LEG_VALUE
	 * @generated
	 * @ordered
	 */
	WITHIN_LEG(0, "WITHIN_LEG", "WITHIN_LEG"),

	/**
	 * The '<em><b>AGAINST YOKE</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #AGAINST_YOKE_VALUE
	 * @generated
	 * @ordered
	 */
	AGAINST_YOKE(1, "AGAINST_YOKE", "AGAINST_YOKE"),

	/**
	 * The '<em><b>BETWEEN POLES</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #BETWEEN_POLES_VALUE
	 * @generated
	 * @ordered
	 */
	BETWEEN_POLES(2, "BETWEEN_POLES", "BETWEEN_POLES");

	/**
	 * The '<em><b>WITHIN LEG</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #WITHIN_LEG
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int WITHIN_LEG_VALUE = 0;

	/**
	 * The '<em><b>AGAINST YOKE</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #AGAINST_YOKE
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int AGAINST_YOKE_VALUE = 1;

	/**
	 * The '<em><b>BETWEEN POLES</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #BETWEEN_POLES
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int BETWEEN_POLES_VALUE = 2;

	/**
	 * An array of all the '<em><b>Gap Place</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final GapPlace[] VALUES_ARRAY =
		new GapPlace[] {
			WITHIN_LEG,
			AGAINST_YOKE,
			BETWEEN_POLES,
		};

	/**
	 * A public read-only list of all the '<em><b>Gap Place</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<GapPlace> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Gap Place</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static GapPlace get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			GapPlace result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Gap Place</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static GapPlace getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			GapPlace result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Gap Place</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static GapPlace get(int value) {
		switch (value) {
			case WITHIN_LEG_VALUE: return WITHIN_LEG;
			case AGAINST_YOKE_VALUE: return AGAINST_YOKE;
			case BETWEEN_POLES_VALUE: return BETWEEN_POLES;
		}
		return null;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final int value;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String name;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String literal;

	/**
	 * Only this class can construct instances.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private GapPlace(int value, String name, String literal) {
		this.value = value;
		this.name = name;
		this.literal = literal;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public int getValue() {
	  return value;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getName() {
	  return name;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getLiteral() {
	  return literal;
	}

	/**
	 * Returns the literal value of the enumerator, which is its string representation.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		return literal;
	}
	
} //GapPlace
